package saltspoke.places;

/**
 * Where a postcode lies.
 *
 * @param name town or district, may be empty
 * @param regionName first-level region, may be empty
 * @param approximate whether the point stands for a wide area or is shared by several codes
 */
record PostalPoint(
    String name, String regionName, double latitudeDeg, double longitudeDeg, boolean approximate) {}

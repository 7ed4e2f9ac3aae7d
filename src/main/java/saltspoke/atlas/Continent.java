package saltspoke.atlas;

/**
 * Coarse continents for judging bias: boxes of latitude and longitude, tried in this order. They
 * cut corners (the Urals are 60° E, the Caucasus is Europe, Central America north of 13° N is North
 * America).
 */
enum Continent {
  ANTARCTICA("Antarctica"),
  NORTH_AMERICA("North America"),
  SOUTH_AMERICA("South America"),
  EUROPE("Europe"),
  AFRICA("Africa"),
  OCEANIA("Oceania"),
  ASIA("Asia");

  private final String title;

  Continent(String title) {
    this.title = title;
  }

  String title() {
    return title;
  }

  static Continent at(double latitudeDeg, double longitudeDeg) {
    if (latitudeDeg < -60) {
      return ANTARCTICA;
    }
    if (longitudeDeg < -30) {
      return latitudeDeg < 30 && longitudeDeg < -120
          ? OCEANIA
          : latitudeDeg >= 13 ? NORTH_AMERICA : SOUTH_AMERICA;
    }
    if (latitudeDeg >= 36 && longitudeDeg < 60) {
      return EUROPE;
    }
    if (latitudeDeg < 36
        && longitudeDeg < 52
        && !(latitudeDeg > 12 && longitudeDeg > 43)
        && !(latitudeDeg > 30 && longitudeDeg > 34)) {
      return AFRICA;
    }
    if (longitudeDeg >= 110 && latitudeDeg < -10 || longitudeDeg >= 130 && latitudeDeg < 20) {
      return OCEANIA;
    }
    return ASIA;
  }
}

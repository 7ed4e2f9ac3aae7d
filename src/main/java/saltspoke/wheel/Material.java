package saltspoke.wheel;

/** Materials that meet at a spoke hole, and three more against which published rates exist. */
public enum Material {
  ALUMINIUM_WROUGHT,
  ALUMINIUM_HIGH_STRENGTH,
  BRASS,
  /** Nickel, bright or electroless. */
  NICKEL,
  CARBON_STEEL,
  ZINC,
  STAINLESS,
  TITANIUM,
  CARBON_FIBRE,
  PLATINUM,
  POLYMER,
  /** Nickel–aluminium bronze; for published checks. */
  NICKEL_ALUMINIUM_BRONZE,
  /** Precipitation-hardening stainless steel; for published checks. */
  STAINLESS_PH
}

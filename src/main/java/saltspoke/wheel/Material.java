package saltspoke.wheel;

/** Materials that meet at a spoke hole. */
public enum Material {
  ALUMINIUM_WROUGHT,
  ALUMINIUM_HIGH_STRENGTH,
  BRASS,
  NICKEL,
  CARBON_STEEL,
  ZINC,
  STAINLESS,
  TITANIUM,
  CARBON_FIBRE,
  PLATINUM,
  POLYMER
}

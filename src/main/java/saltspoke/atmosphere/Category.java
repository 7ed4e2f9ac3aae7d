package saltspoke.atmosphere;

/** Corrosivity categories of ISO 9223:2012, mildest first. */
public enum Category {
  C1,
  C2,
  C3,
  C4,
  C5,
  CX
}

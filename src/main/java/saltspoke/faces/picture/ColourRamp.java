package saltspoke.faces.picture;

/**
 * A sequence of colours from little to much. Anchors are set in OKLCH (Ottosson 2020) with falling
 * lightness, and joined by straight lines in OKLab, so that equal steps look equal, order survives
 * in grey, and no step leans on red against green alone. The anchors are this project's own.
 */
public final class ColourRamp {
  /** Bright metal, brass, copper, rust, oxide: for corrosion and salt. */
  public static final ColourRamp OXIDE =
      new ColourRamp(
          new double[][] {
            {0.95, 0.012, 220},
            {0.86, 0.085, 92},
            {0.70, 0.13, 62},
            {0.52, 0.14, 38},
            {0.30, 0.075, 25}
          });

  /** Dew to deep water: for wetness and cold. */
  public static final ColourRamp WATER =
      new ColourRamp(
          new double[][] {
            {0.95, 0.025, 140},
            {0.80, 0.075, 185},
            {0.60, 0.09, 225},
            {0.42, 0.11, 262},
            {0.27, 0.08, 290}
          });

  private final double[][] labAnchors;

  private ColourRamp(double[][] lchAnchors) {
    labAnchors = new double[lchAnchors.length][];
    for (int i = 0; i < lchAnchors.length; i++) {
      double hue = Math.toRadians(lchAnchors[i][2]);
      labAnchors[i] =
          new double[] {
            lchAnchors[i][0], lchAnchors[i][1] * Math.cos(hue), lchAnchors[i][1] * Math.sin(hue)
          };
    }
  }

  /**
   * The colour at a share of the ramp.
   *
   * @param share 0 for least to 1 for most
   * @return opaque sRGB as 0xFFRRGGBB
   */
  public int argb(double share) {
    if (!(share >= 0 && share <= 1)) {
      throw new IllegalArgumentException("a share of the ramp is 0..1, not " + share);
    }
    double[] lab = lab(share);
    return 0xFF000000 | srgb(lab[0], lab[1], lab[2]);
  }

  /** As many colours as steps, spread evenly from end to end. */
  public int[] steps(int count) {
    int[] colours = new int[count];
    for (int i = 0; i < count; i++) {
      colours[i] = argb(i / (double) (count - 1));
    }
    return colours;
  }

  /** {@code #rrggbb} of a colour. */
  public static String css(int argb) {
    return String.format("#%06x", argb & 0xFFFFFF);
  }

  private double[] lab(double share) {
    double x = share * (labAnchors.length - 1);
    int i = Math.min((int) x, labAnchors.length - 2);
    double f = x - i;
    double[] mixed = new double[3];
    for (int k = 0; k < 3; k++) {
      mixed[k] = labAnchors[i][k] * (1 - f) + labAnchors[i + 1][k] * f;
    }
    return mixed;
  }

  /** OKLab to sRGB; matrices as published by Ottosson 2020 (from memory). */
  private static int srgb(double lightness, double a, double b) {
    double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
    double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
    double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
    int red = channel(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
    int green = channel(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
    int blue = channel(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
    return red << 16 | green << 8 | blue;
  }

  private static double cube(double x) {
    return x * x * x;
  }

  /** Linear light to an sRGB byte by the transfer curve of IEC 61966-2-1. */
  private static int channel(double linear) {
    double inGamut = Math.max(0, Math.min(1, linear));
    double coded =
        inGamut <= 0.0031308 ? 12.92 * inGamut : 1.055 * Math.pow(inGamut, 1 / 2.4) - 0.055;
    return (int) Math.round(255 * coded);
  }
}

package saltspoke.faces.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.Category;

@Tag("law")
class ColourRampTest {
  /** Full dichromacy in linear sRGB, Machado, Oliveira and Fernandes 2009 (from memory). */
  private static final double[][][] DICHROMATS = {
    {
      {0.152286, 1.052583, -0.204868},
      {0.114503, 0.786281, 0.099216},
      {-0.003882, -0.048116, 1.051998}
    },
    {
      {0.367322, 0.860646, -0.227968},
      {0.280085, 0.672501, 0.047413},
      {-0.011820, 0.042940, 0.968881}
    },
    {
      {1.255528, -0.076749, -0.178779},
      {-0.078411, 0.930809, 0.147602},
      {0.004733, 0.691367, 0.303900}
    }
  };

  /** Steps of a legend should differ by several times the just noticeable 0.02 in OKLab. */
  private static final double LEAST_STEP = 0.08;

  @Test
  void lightnessFallsFromStepToStep() {
    for (ColourRamp ramp : new ColourRamp[] {ColourRamp.OXIDE, ColourRamp.WATER}) {
      double before = 2;
      for (int colour : ramp.steps(6)) {
        double lightness = oklab(linear(colour))[0];
        assertTrue(lightness < before - 0.04, ColourRamp.css(colour));
        before = lightness;
      }
    }
  }

  @Test
  void neighboursDifferForEveryKindOfColourVision() {
    for (ColourRamp ramp : new ColourRamp[] {ColourRamp.OXIDE, ColourRamp.WATER}) {
      int[] steps = ramp.steps(6);
      for (int i = 1; i < steps.length; i++) {
        for (double[][] vision : DICHROMATS) {
          double apart = distance(oklab(seen(vision, steps[i - 1])), oklab(seen(vision, steps[i])));
          assertTrue(apart > LEAST_STEP, i + ": " + apart);
        }
      }
    }
  }

  @Test
  void thePageUsesTheSameColoursForClassesAsTheMap() throws Exception {
    String css = Files.readString(Path.of("web/css/page.css"), StandardCharsets.UTF_8);
    int[] steps = ColourRamp.OXIDE.steps(Category.values().length);
    for (Category category : Category.values()) {
      String name = "--" + category.name().toLowerCase(java.util.Locale.ROOT) + ": ";
      int at = css.indexOf(name) + name.length();
      assertEquals(ColourRamp.css(steps[category.ordinal()]), css.substring(at, at + 7));
    }
  }

  private static double[] linear(int argb) {
    double[] rgb = new double[3];
    for (int i = 0; i < 3; i++) {
      double coded = (argb >> (16 - 8 * i) & 0xFF) / 255.0;
      rgb[i] = coded <= 0.04045 ? coded / 12.92 : Math.pow((coded + 0.055) / 1.055, 2.4);
    }
    return rgb;
  }

  private static double[] seen(double[][] vision, int argb) {
    double[] rgb = linear(argb);
    double[] seen = new double[3];
    for (int i = 0; i < 3; i++) {
      double sum = 0;
      for (int k = 0; k < 3; k++) {
        sum += vision[i][k] * rgb[k];
      }
      seen[i] = Math.max(0, Math.min(1, sum));
    }
    return seen;
  }

  private static double[] oklab(double[] rgb) {
    double l = Math.cbrt(0.4122214708 * rgb[0] + 0.5363325363 * rgb[1] + 0.0514459929 * rgb[2]);
    double m = Math.cbrt(0.2119034982 * rgb[0] + 0.6806995451 * rgb[1] + 0.1073969566 * rgb[2]);
    double s = Math.cbrt(0.0883024619 * rgb[0] + 0.2817188376 * rgb[1] + 0.6299787005 * rgb[2]);
    return new double[] {
      0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
      1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
      0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s
    };
  }

  private static double distance(double[] a, double[] b) {
    return Math.sqrt(
        Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2) + Math.pow(a[2] - b[2], 2));
  }
}

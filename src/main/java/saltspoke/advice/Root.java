package saltspoke.advice;

import java.util.function.DoubleUnaryOperator;

/** Where a rising function passes zero. */
final class Root {
  private Root() {}

  /**
   * By inverse quadratic interpolation where it is safe and halving where not (Chandrupatla 1997,
   * Advances in Engineering Software 28, from memory): a third of the evaluations that halving
   * alone takes.
   *
   * @param rising never falling between the ends; its value at {@code most} is at least zero
   * @param error of the place, above 0
   * @return a place within the error of the root; {@code least} when the function is not negative
   *     there
   */
  static double ofRising(DoubleUnaryOperator rising, double least, double most, double error) {
    double a = most;
    double fa = rising.applyAsDouble(a);
    double b = least;
    double fb = rising.applyAsDouble(b);
    if (fb >= 0) {
      return least;
    }
    double part = 0.5;
    while (true) {
      double x = a + part * (b - a);
      double fx = rising.applyAsDouble(x);
      double c = a;
      double fc = fa;
      if ((fx >= 0) != (fa >= 0)) {
        c = b;
        fc = fb;
        b = a;
        fb = fa;
      }
      a = x;
      fa = fx;
      double width = Math.abs(b - a);
      if (fa == 0 || width <= error) {
        return Math.abs(fa) < Math.abs(fb) ? a : b;
      }
      double xi = (a - b) / (c - b);
      double phi = (fa - fb) / (fc - fb);
      boolean safe = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
      part =
          safe
              ? fa / (fb - fa) * fc / (fb - fc)
                  + (c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb)
              : 0.5;
      double edge = error / (2 * width);
      part = Math.min(1 - edge, Math.max(edge, part));
    }
  }
}

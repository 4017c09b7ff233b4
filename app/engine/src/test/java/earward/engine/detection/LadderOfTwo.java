package earward.engine.detection;

/** The network of the reference circuits, in complex arithmetic of its own: A, B and W above. */
final class LadderOfTwo {
  private final double c1;
  private final double r1;
  private final double r2;
  private final double c2;
  private final double cc;
  private final double rl;

  LadderOfTwo(double c1, double r1, double r2, double c2, double cc, double rl) {
    this.c1 = c1;
    this.r1 = r1;
    this.r2 = r2;
    this.c2 = c2;
    this.cc = cc;
    this.rl = rl;
  }

  /**
   * Impedance at A: {real, imaginary}; and the transfer from A's current to W: {real, imaginary}.
   */
  private double[] at(double radians) {
    if (radians == 0) {
      return new double[] {r1, 0, 0, 0};
    }
    double[] toWiper = {rl, -1 / (radians * cc)};
    double[] shuntB = parallel(toWiper, new double[] {0, -1 / (radians * c2)});
    double[] branch = {r2 + shuntB[0], shuntB[1]};
    double[] shuntA = parallel(new double[] {r1, 0}, new double[] {0, -1 / (radians * c1)});
    double[] a = parallel(branch, shuntA);
    double[] b = times(a, divide(shuntB, branch));
    double[] w = times(b, divide(new double[] {rl, 0}, toWiper));
    return new double[] {a[0], a[1], w[0], w[1]};
  }

  CarrierSurroundings around(
      EnvelopeSolver solver,
      boolean tuned,
      double carrierHertz,
      double toneHertz,
      double sourceOhms,
      double quality) {
    CarrierSurroundings around =
        new CarrierSurroundings(1, solver.carrierHarmonics(), solver.audioHarmonics());
    double carrier = 2 * Math.PI * carrierHertz;
    around.carrierRadians = carrier;
    around.tuned = tuned;
    around.tankOhms = sourceOhms;
    around.tankFarads = quality / (carrier * sourceOhms);
    around.transferReal[0] = 1;
    double henries = sourceOhms / (carrier * quality);
    for (int k = 1; k <= solver.carrierHarmonics(); k++) {
      double radians = k * carrier;
      double[] z = at(radians);
      double[] own = {tuned ? 0 : sourceOhms, 0};
      if (tuned && k > 1) {
        double susceptance = radians * around.tankFarads - 1 / (radians * henries);
        double size = 1 / (sourceOhms * sourceOhms) + susceptance * susceptance;
        own = new double[] {1 / sourceOhms / size, -susceptance / size};
      }
      around.carrierRealOhms[around.index(k, 0, 0)] = z[0] + own[0];
      around.carrierImaginaryOhms[around.index(k, 0, 0)] = z[1] + own[1];
    }
    for (int h = 0; h <= solver.audioHarmonics(); h++) {
      double[] z = at(h * 2 * Math.PI * toneHertz);
      around.audioRealOhms[around.index(h, 0, 0)] = z[0] + (tuned ? 0 : sourceOhms);
      around.audioImaginaryOhms[around.index(h, 0, 0)] = z[1];
    }
    return around;
  }

  double wiperOhms(double radians) {
    double[] z = at(radians);
    return Math.hypot(z[2], z[3]);
  }

  double rippleAtA(EnvelopeSolver solver, double carrierHertz) {
    int width = solver.carrierHarmonics() + 1;
    double sum = 0;
    for (int s = 0; s < solver.audioSamples(); s++) {
      for (int k = 1; k < width; k++) {
        double[] z = at(2 * Math.PI * k * carrierHertz);
        double amperes =
            Math.hypot(
                solver.carrierReal()[s * width + k], solver.carrierImaginary()[s * width + k]);
        sum += 0.5 * amperes * amperes * (z[0] * z[0] + z[1] * z[1]);
      }
    }
    return Math.sqrt(sum / solver.audioSamples());
  }

  private static double[] times(double[] a, double[] b) {
    return new double[] {a[0] * b[0] - a[1] * b[1], a[0] * b[1] + a[1] * b[0]};
  }

  private static double[] divide(double[] a, double[] b) {
    double size = b[0] * b[0] + b[1] * b[1];
    return new double[] {(a[0] * b[0] + a[1] * b[1]) / size, (a[1] * b[0] - a[0] * b[1]) / size};
  }

  private static double[] parallel(double[] a, double[] b) {
    return divide(times(a, b), new double[] {a[0] + b[0], a[1] + b[1]});
  }
}

package earward.engine.internal;

import earward.engine.law.AmplifierLaw;
import earward.engine.law.DirectStage;
import java.util.Arrays;

/**
 * By how much the rail of each amplifier dips, beyond its mean over the cycle, when the output is
 * at its peak: the impedance of the whole supply with its bypass at the harmonics of the tone,
 * times the harmonics of what the output draws. Mutable, for one thread.
 */
final class RailDips {
  private static final int HARMONICS = 8;

  /** Nearness to the highest value at which a wave is at its limit. */
  private static final double AT_LIMIT = 0.999;

  private final double[] railRe;
  private final double[] railIm;
  private final double[] restRe;
  private final double[] restIm;

  /** Loss of the upper limit, in V for one ampere of peak current. */
  private final double[] up;

  /** Loss of the lower limit. */
  private final double[] down;

  private final double[] drawnRe = new double[HARMONICS + 1];
  private final double[] drawnIm = new double[HARMONICS + 1];
  private boolean known;
  private final HarmonicSolver several;

  RailDips(int amplifiers, int size) {
    several = new HarmonicSolver(size, HARMONICS);
    railRe = new double[amplifiers * (HARMONICS + 1)];
    railIm = new double[railRe.length];
    restRe = new double[railRe.length];
    restIm = new double[railRe.length];
    up = new double[amplifiers];
    down = new double[amplifiers];
  }

  /** Until they are measured, rails stay at their mean. */
  void clear() {
    known = false;
    Arrays.fill(up, 0);
    Arrays.fill(down, 0);
  }

  boolean known() {
    return known;
  }

  double upOhms(int amplifier) {
    return up[amplifier];
  }

  double downOhms(int amplifier) {
    return down[amplifier];
  }

  /** Keeps the order of elimination from now on. */
  void freeze() {
    several.freeze();
  }

  /** Impedances of all rails at the harmonics of the tone. */
  boolean measure(
      Network network, AlternatingSolver solver, DirectStage point, double toneRadians) {
    known =
        measureAtOnce(network, solver, point, toneRadians)
            || measureOneByOne(network, solver, point, toneRadians);
    return known;
  }

  private boolean measureAtOnce(
      Network network, AlternatingSolver solver, DirectStage point, double toneRadians) {
    if (!several.factor(solver, toneRadians, false)) {
      return false;
    }
    for (AmplifierLaw amplifier : network.amplifiers) {
      int supply = amplifier.supplyNode(point);
      int ground = amplifier.groundNode(point);
      int reference = amplifier.restNode(point);
      double share = amplifier.restShare(point);
      several.rest();
      several.push(supply, ground, 1);
      if (!several.solve()) {
        return false;
      }
      for (int h = 1; h <= HARMONICS; h++) {
        int at = amplifier.ordinal() * (HARMONICS + 1) + h;
        railRe[at] = several.re(ground, h) - several.re(supply, h);
        railIm[at] = several.im(ground, h) - several.im(supply, h);
        restRe[at] = share * (several.re(ground, h) - several.re(reference, h));
        restIm[at] = share * (several.im(ground, h) - several.im(reference, h));
      }
    }
    return true;
  }

  private boolean measureOneByOne(
      Network network, AlternatingSolver solver, DirectStage point, double toneRadians) {
    for (int h = 1; h <= HARMONICS; h++) {
      if (!solver.audio(h * toneRadians)) {
        return false;
      }
      for (AmplifierLaw amplifier : network.amplifiers) {
        int at = amplifier.ordinal() * (HARMONICS + 1) + h;
        int supply = amplifier.supplyNode(point);
        int ground = amplifier.groundNode(point);
        int reference = amplifier.restNode(point);
        double share = amplifier.restShare(point);
        solver.rest();
        solver.push(supply, ground, 1, 0);
        solver.solve();
        railRe[at] = solver.re(ground) - solver.re(supply);
        railIm[at] = solver.im(ground) - solver.im(supply);
        restRe[at] = share * (solver.re(ground) - solver.re(reference));
        restIm[at] = share * (solver.im(ground) - solver.im(reference));
      }
    }
    return true;
  }

  /** Takes over a wave: from now on the limits allow for what it makes of the rail. */
  void follow(AmplifierLaw amplifier, OutputWave wave) {
    int a = amplifier.ordinal();
    double highest = 0;
    double lowest = 0;
    for (double volts : wave.volts) {
      lowest = Math.min(lowest, volts);
      highest = Math.max(highest, volts);
    }
    wave.drawnHarmonics(HARMONICS, drawnRe, drawnIm);
    double most = Double.NEGATIVE_INFINITY;
    double least = 0;
    for (int s = 0; s < OutputWave.SAMPLES; s++) {
      if (wave.volts[s] >= AT_LIMIT * highest) {
        most = Math.max(most, dip(a, wave, s, true));
      }
      if (wave.volts[s] <= AT_LIMIT * lowest) {
        least = Math.max(least, dip(a, wave, s, false));
      }
    }
    up[a] = Math.max(0, most);
    down[a] = least;
  }

  /** The dip at one sample: of rail less rest, or of rest. */
  private double dip(int a, OutputWave wave, int sample, boolean ofUpper) {
    double sum = 0;
    for (int h = 1; h <= HARMONICS; h++) {
      int at = a * (HARMONICS + 1) + h;
      double zr = ofUpper ? railRe[at] - restRe[at] : restRe[at];
      double zi = ofUpper ? railIm[at] - restIm[at] : restIm[at];
      double r = zr * drawnRe[h] - zi * drawnIm[h];
      double m = zr * drawnIm[h] + zi * drawnRe[h];
      sum += r * wave.cosine(h * sample) - m * wave.sine(h * sample);
    }
    return sum;
  }
}

package earward.engine.internal;

import earward.engine.law.AmplifierLaw;
import java.util.Arrays;

/**
 * What class-B outputs take from their rail beyond its linear share: of a current i the supply
 * gives max(0, i) = i/2 + |i|/2. The first part stands in the circuit's equations; the second, its
 * mean apart, is added here: even harmonics above all, which come back as ripple of the rail.
 * Mutable, for one thread.
 */
final class HalfWaves {
  /** What comes back changes the currents a little; after the second round nothing more is seen. */
  private static final int ROUNDS = 2;

  private final Network network;
  private final double[] cosine;
  private final double[] sine;
  private final double[] amperes;
  private final double[] taken;
  private final double[] addedRe;
  private final double[] addedIm;

  /** Room for waves of as many samples as the tables of one turn have. */
  HalfWaves(Network network, double[] cosine, double[] sine) {
    this.network = network;
    this.cosine = cosine;
    this.sine = sine;
    amperes = new double[cosine.length];
    taken = new double[cosine.length];
    addedRe = new double[cosine.length];
    addedIm = new double[cosine.length];
  }

  /**
   * Adds them to all unknowns.
   *
   * @param column of the table in which the first amplifier's supply stands
   * @param signal harmonics of all unknowns, changed in place
   */
  void add(AudioTable table, int column, AudioSignal signal) {
    for (AmplifierLaw amplifier : network.amplifiers) {
      Arrays.fill(addedRe, 0);
      Arrays.fill(addedIm, 0);
      for (int round = 0; round < ROUNDS; round++) {
        Arrays.fill(taken, 0);
        for (int k = 0; k < amplifier.branches(); k++) {
          double unused = signal.wave(amplifier.outputBranch(k), amperes, cosine, sine);
          assert unused >= 0;
          for (int s = 0; s < taken.length; s++) {
            taken[s] += Math.abs(amperes[s]) / 2;
          }
        }
        draw(table, column + amplifier.ordinal(), signal);
      }
    }
  }

  /** Brings what the rail has given so far to what is taken. */
  private void draw(AudioTable table, int column, AudioSignal signal) {
    int samples = taken.length;
    for (int h = 1; h <= signal.harmonics; h++) {
      double real = 0;
      double imaginary = 0;
      for (int s = 0; s < samples; s++) {
        int turn = (h * s) % samples;
        real += 2.0 / samples * taken[s] * cosine[turn];
        imaginary -= 2.0 / samples * taken[s] * sine[turn];
      }
      signal.add(table, h, column, real - addedRe[h], imaginary - addedIm[h]);
      addedRe[h] = real;
      addedIm[h] = imaginary;
    }
  }
}

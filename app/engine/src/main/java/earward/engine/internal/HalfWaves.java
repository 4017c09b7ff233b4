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
  private final double[] amperes;
  private final double[] taken;
  private final double[] addedRe;
  private final double[] addedIm;

  HalfWaves(Network network) {
    this.network = network;
    amperes = new double[Turns.SAMPLES];
    taken = new double[Turns.SAMPLES];
    addedRe = new double[Turns.SAMPLES];
    addedIm = new double[Turns.SAMPLES];
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
          double unused = signal.wave(amplifier.outputBranch(k), amperes);
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
    for (int h = 1; h <= signal.harmonics; h++) {
      double real = Turns.real(h, taken);
      double imaginary = Turns.imaginary(h, taken);
      signal.add(table, h, column, real - addedRe[h], imaginary - addedIm[h]);
      addedRe[h] = real;
      addedIm[h] = imaginary;
    }
  }
}

package earward.engine.internal;

import earward.engine.law.AmplifierLaw;
import earward.engine.law.DirectStage;

/**
 * Finds the output current at which the swing that the supply leaves and the load agree. Along the
 * line on which DC moves with the mean current that the output draws the balance is found without
 * solving DC; then DC is corrected by the factors that are there, and so in turn until DC is met
 * too. Newton's method on both at once, its factors kept as long as they serve. Mutable, for one
 * thread.
 */
final class PeakSearch {
  private static final int MOST_ROUNDS = 20;
  private static final int MOST_STEPS = 60;

  /** A residual that shrinks by less than this asks for new factors. */
  private static final double SLOW = 0.1;

  /** Nearness of the balance, as a share. */
  private static final double EXACT = 1e-14;

  /** Excess that a supply without any resistance leaves by rounding, as a share. */
  private static final double BALANCED = 1e-9;

  private final double[] from;
  private final double[] along;
  private double fromAmperes;

  PeakSearch(int size) {
    from = new double[size];
    along = new double[size];
  }

  /**
   * Searches from the present point, whose factors need not be its own.
   *
   * @param share of the range between rest and clipping
   * @param drawnMean mean current that is drawn, over the peak
   * @param ohms that the output works into
   * @param enough largest change of DC, in V or A, at which it counts as met; 0: by its residual
   * @return peak current in A; NaN where the search leads nowhere
   */
  double find(
      DirectSolver direct,
      Outputs outputs,
      AmplifierLaw amplifier,
      double share,
      double drawnMean,
      double ohms,
      double enough) {
    direction(direct, amplifier);
    double former = Double.POSITIVE_INFINITY;
    for (int round = 0; round < MOST_ROUNDS; round++) {
      double peak = balance(direct.stage(), outputs, amplifier, share, drawnMean, ohms);
      if (Double.isNaN(peak)) {
        return peak;
      }
      double off = direct.residual();
      if (DirectSolver.sure(off)) {
        return peak;
      }
      if (!(off < SLOW * former)) {
        if (!direct.factor()) {
          return Double.NaN;
        }
        direction(direct, amplifier);
      }
      former = round == 0 ? Double.POSITIVE_INFINITY : off;
      double moved = direct.correct();
      if (Double.isNaN(moved)) {
        return Double.NaN;
      }
      if (moved < enough) {
        return balance(direct.stage(), outputs, amplifier, share, drawnMean, ohms);
      }
    }
    return Double.NaN;
  }

  /** How all unknowns move with the mean current that the output draws. */
  private void direction(DirectSolver direct, AmplifierLaw amplifier) {
    DirectStage stage = direct.stage();
    direct.push(amplifier.supplyNode(stage), amplifier.groundNode(stage), along);
  }

  /** The peak at which swing and load agree along the line; leaves point and current there. */
  private double balance(
      DirectStage stage,
      Outputs outputs,
      AmplifierLaw amplifier,
      double share,
      double drawnMean,
      double ohms) {
    System.arraycopy(stage.solution(), 0, from, 0, from.length);
    fromAmperes = stage.signalAmperes()[amplifier.ordinal()];
    double low = 0;
    move(stage, amplifier, 0);
    double atLow = share * outputs.peakVolts(amplifier, stage, 0);
    double high = atLow / ohms;
    double atHigh = excess(stage, outputs, amplifier, share, drawnMean, ohms, high);
    if (atHigh > BALANCED * (1 + atLow)) {
      return Double.NaN; // more current, more swing: nothing that this line can tell
    }
    double peak = high;
    for (int i = 0; i < MOST_STEPS && atHigh < 0 && high - low > EXACT * high; i++) {
      peak = low + (high - low) * atLow / (atLow - atHigh);
      double here = excess(stage, outputs, amplifier, share, drawnMean, ohms, peak);
      if (Math.abs(here) <= EXACT * (1 + peak * ohms)) {
        break;
      }
      if (here > 0) {
        low = peak;
        atLow = here;
        atHigh /= 2;
      } else {
        high = peak;
        atHigh = here;
        atLow /= 2;
      }
    }
    return peak;
  }

  private double excess(
      DirectStage stage,
      Outputs outputs,
      AmplifierLaw amplifier,
      double share,
      double drawnMean,
      double ohms,
      double peak) {
    move(stage, amplifier, drawnMean * peak);
    return share * outputs.peakVolts(amplifier, stage, peak) - peak * ohms;
  }

  private void move(DirectStage stage, AmplifierLaw amplifier, double amperes) {
    double[] x = stage.solution();
    double by = amperes - fromAmperes;
    for (int i = 0; i < x.length; i++) {
      x[i] = from[i] + by * along[i];
    }
    stage.signalAmperes()[amplifier.ordinal()] = amperes;
  }
}

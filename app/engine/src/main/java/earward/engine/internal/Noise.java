package earward.engine.internal;

import earward.block.law.AWeighting;
import earward.engine.Drive;
import earward.engine.law.Law;
import earward.engine.law.NoiseStage;
import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * The back end's own noise at the places of one case, by one adjoint solve for each place and
 * frequency.
 *
 * <p>Integrated over the logarithm of frequency by Gauss and Legendre's four points in panels of
 * half a decade at most. Mutable, for one thread; makes no garbage.
 */
final class Noise {
  /** Band of weighted noise (IEC 60268-1: 22.4 Hz to 22.4 kHz, from memory). */
  static final double LEAST_HERTZ = 22.4;

  static final double MOST_HERTZ = 22.4e3;

  private static final double[] POINTS = {-0.8611363115940526, -0.3399810435848563};
  private static final double[] WEIGHTS = {0.3478548451374538, 0.6521451548625461};
  private static final double PANEL = Math.log(10) / 2;

  private final int[] plus;
  private final int[] minus;
  private final double[] flat;
  private final double[] weighted;
  private final PortNoise driven;
  private final NoiseStage sum;
  private boolean done;

  /** Room for the noise of one case. */
  Noise(CasePlan plan, Network network, AlternatingSolver solver) {
    plus = plan.noisePlus();
    minus = plan.noiseMinus();
    flat = new double[plus.length];
    weighted = new double[plus.length];
    driven = new PortNoise(network.ports.length);
    sum = new NoiseStage(solver.stage());
  }

  /** Everything is to be worked out anew. */
  void clear() {
    done = false;
    driven.clear();
  }

  /** Noise between the nodes of a place, rms in V; NaN where the case has no solution. */
  double rmsVolts(CaseWork work, int place, boolean byCurveA) {
    if (!done) {
      done = true;
      measure(work);
    }
    return Math.sqrt(byCurveA ? weighted[place] : flat[place]);
  }

  private void measure(CaseWork work) {
    Arrays.fill(flat, 0);
    Arrays.fill(weighted, 0);
    boolean silent = work.plan.drive == Drive.UNPOWERED;
    boolean ready = !silent && work.solved() && (!driven(work) || work.carrierSolved());
    double low = work.row[work.network.lowestTone];
    double high = work.row[work.network.highestTone];
    ready = ready && band(work, Math.min(low, LEAST_HERTZ), low, false);
    ready = ready && band(work, low, high, true);
    ready = ready && band(work, high, Math.max(high, MOST_HERTZ), false);
    if (!ready) {
      Arrays.fill(flat, Double.NaN);
      Arrays.fill(weighted, Double.NaN);
    }
  }

  private static boolean driven(CaseWork work) {
    return work.detection != null && work.plan.drive == Drive.SIGNAL;
  }

  private boolean band(CaseWork work, double from, double to, boolean inside) {
    double whole = Math.log(to / from);
    int panels = (int) Math.ceil(whole / PANEL - 1e-9);
    double half = whole / panels / 2;
    for (int p = 0; p < panels; p++) {
      double middle = Math.log(from) + (2 * p + 1) * half;
      for (int g = 0; g < 2 * POINTS.length; g++) {
        double point = g < POINTS.length ? POINTS[g] : -POINTS[g - POINTS.length];
        double hertz = Math.exp(middle + point * half);
        double bandHertz = WEIGHTS[g % POINTS.length] * half * hertz;
        if (!at(work, hertz, bandHertz, inside)) {
          return false;
        }
      }
    }
    return true;
  }

  /** Adds one frequency's noise over so many hertz, at every place. */
  private boolean at(CaseWork work, double hertz, double bandHertz, boolean inside) {
    if (!SmallResponse.stamped(work, hertz)) {
      return false;
    }
    Detection detection = driven(work) ? work.detection : null;
    double factor = AWeighting.factor(hertz);
    boolean heard = hertz >= LEAST_HERTZ && hertz <= MOST_HERTZ;
    for (int i = 0; i < plus.length; i++) {
      work.alternating.rest();
      work.alternating.push(minus[i], plus[i], 1, 0);
      work.alternating.solveTransposed();
      double density = density(work, detection);
      flat[i] += inside ? density * bandHertz : 0;
      weighted[i] += heard ? density * factor * factor * bandHertz : 0;
    }
    return true;
  }

  /** Square of the noise at the place whose adjoint solution stands in the solver, in V²/Hz. */
  private double density(CaseWork work, @Nullable Detection detection) {
    sum.begin(work.alternating.re, work.alternating.im);
    for (Law law : work.network.laws) {
      law.noise(sum);
    }
    if (detection != null) {
      driven.add(work, detection, sum);
    }
    return sum.squareVoltsPerHertz();
  }
}

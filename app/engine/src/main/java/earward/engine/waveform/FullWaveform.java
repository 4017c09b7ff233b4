package earward.engine.waveform;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The full waveform of one circuit and one drive: aligned on the bare carrier as a builder does,
 * run until it is periodic, and run again with half the step until all figures hold still. Nothing
 * is averaged over the carrier and nothing comes from the carrier-averaged method. For one thread.
 */
public final class FullWaveform {
  private static final int FIRST_STEPS = 32;
  private static final int MOST_STEPS = 512;

  /** Share of itself by which a figure may move when the step is halved. */
  private static final double STILL = 3e-4;

  /** So much a figure may move in any case: a level in V, a distortion as a fraction. */
  private static final double LEAST_VOLTS = 1e-8;

  /** The same of a carrier's residue; and of its second and third harmonics beside the first. */
  private static final double LEAST_CARRIER = 1e-7;

  private static final double RESIDUE_SHARE = 1e-4;

  /** On a carrier-hot winding DC and audio are held against the carrier; distortion is not. */
  private static final double CARRIER_SHARE = 1e-6;

  private static final double DISTORTED_SHARE = 1e-3;

  /** Behind a coupling capacitor DC is next to nothing and held against the audio there. */
  private static final double DC_SHARE = 0.1;

  private static final double LEAST_DISTORTION = 5e-6;

  /** Fundamental below which distortion means nothing, rms, in V. */
  private static final double LEAST_AUDIO = 1e-6;

  private final Stamping stamping;
  private final WaveformTask task;
  private final WaveformListener listener;
  private long steps;

  /**
   * A run to be made.
   *
   * @param stamping gives the equations
   * @param task what is run and measured
   * @param listener is told how it goes on
   */
  public FullWaveform(Stamping stamping, WaveformTask task, WaveformListener listener) {
    this.stamping = stamping;
    this.task = task;
    this.listener = listener;
  }

  /** One step size's outcome. */
  private record Pass(
      int count, Stepper stepper, Shooting.End end, double feedWatts, List<WaveformFigures> all) {}

  /**
   * Runs it.
   *
   * @throws IllegalArgumentException with a clause when the equations are singular
   */
  public WaveformResult solve() {
    Alignment alignment = new Alignment(stamping, task, listener);
    Shooting.End aligned = alignment.align();
    if (aligned == Shooting.End.CANCELLED) {
      return ended(WaveformResult.End.CANCELLED, "", null, Double.NaN);
    }
    if (task.tuned() && aligned != Shooting.End.FOUND) {
      String what = "the winding could not be peaked on the carrier";
      return ended(WaveformResult.End.NOT_SOLVED, what, null, Double.NaN);
    }
    Stepper from = alignment.stepper();
    Pass former = null;
    double still = Double.NaN;
    for (int count = FIRST_STEPS; count <= MOST_STEPS; count *= 2) {
      Pass pass = pass(count, from, alignment.tuningRadians());
      if (pass.end() == Shooting.End.CANCELLED) {
        return ended(WaveformResult.End.CANCELLED, "", former, still);
      }
      if (pass.end() != Shooting.End.FOUND) {
        boolean failed = pass.end() == Shooting.End.FAILED;
        String what =
            failed
                ? "a step of the waveform has no solution"
                : "the waveform did not become periodic";
        return ended(WaveformResult.End.NOT_SOLVED, what, pass, still);
      }
      if (former != null) {
        still = moved(former.all(), pass.all());
        if (still <= 1) {
          return ended(WaveformResult.End.SOLVED, "", pass, still);
        }
      }
      former = pass;
      from = pass.stepper();
    }
    String what = "its figures still move with the finest step";
    return ended(WaveformResult.End.NOT_SOLVED, what, former, still);
  }

  private Pass pass(int count, Stepper from, double tuningRadians) {
    Stepper stepper = Alignment.stepper(stamping.stamped(tuningRadians, false), task, count);
    stepper.takeOver(from);
    Reader reader = new Reader(stepper.circuit);
    double[][] rows = Alignment.rows(reader, task);
    int cycles = task.cycles();
    Drive drive = new Drive(task.peakVolts(), task.depth(), cycles, count);
    Gauge gauge = new Gauge(rows, reader.power(), task.squares(), count, cycles);
    Shooting shooting = new Shooting(stepper, drive, gauge, rows);
    Shooting.End end = shooting.search(listener, count);
    steps += (long) shooting.run() * cycles * count;
    return new Pass(count, stepper, end, gauge.feedWatts(), figures(gauge));
  }

  private List<WaveformFigures> figures(Gauge gauge) {
    List<WaveformFigures> all = new ArrayList<>();
    for (int p = 0; p < task.places().size(); p++) {
      double audio = gauge.peak(p, 1) / Math.sqrt(2);
      double sum = 0;
      for (int h = 2; h <= Gauge.HARMONICS; h++) {
        double here = gauge.peak(p, h) / Math.sqrt(2);
        sum += here * here;
      }
      all.add(
          new WaveformFigures(
              task.places().get(p).name(),
              gauge.mean(p),
              audio,
              audio > LEAST_AUDIO ? Math.sqrt(sum) / audio : Double.NaN,
              gauge.carrierRms(p, 1),
              gauge.carrierRms(p, 2),
              gauge.carrierRms(p, 3),
              gauge.meanSquare(p)));
    }
    return all;
  }

  /** The largest move of a figure over what it may be. */
  private static double moved(List<WaveformFigures> former, List<WaveformFigures> now) {
    double most = 0;
    for (int p = 0; p < now.size(); p++) {
      WaveformFigures a = former.get(p);
      WaveformFigures b = now.get(p);
      double least = Math.max(LEAST_VOLTS, CARRIER_SHARE * b.carrierRmsVolts());
      double direct = Math.max(least, DC_SHARE * STILL * b.audioRmsVolts());
      most = Math.max(most, over(a.dcVolts(), b.dcVolts(), direct));
      most = Math.max(most, over(a.audioRmsVolts(), b.audioRmsVolts(), least));
      double residue = Math.max(LEAST_CARRIER, RESIDUE_SHARE * b.carrierRmsVolts());
      most = Math.max(most, over(a.carrierRmsVolts(), b.carrierRmsVolts(), LEAST_CARRIER));
      most = Math.max(most, over(a.secondCarrierRmsVolts(), b.secondCarrierRmsVolts(), residue));
      most = Math.max(most, over(a.thirdCarrierRmsVolts(), b.thirdCarrierRmsVolts(), residue));
      boolean heard = b.audioRmsVolts() > DISTORTED_SHARE * b.carrierRmsVolts();
      if (heard && a.distortion() < 1 && b.distortion() < 1) {
        most = Math.max(most, over(a.distortion(), b.distortion(), LEAST_DISTORTION));
      }
    }
    return most;
  }

  private static double over(double former, double now, double least) {
    return Math.abs(now - former) / Math.max(least, STILL * Math.abs(now));
  }

  private WaveformResult ended(
      WaveformResult.End end, String trouble, @Nullable Pass pass, double still) {
    return new WaveformResult(
        end,
        trouble,
        pass == null ? 0 : pass.count(),
        task.cycles(),
        task.carrierHertz() / task.cycles(),
        steps,
        still,
        pass == null ? Double.NaN : pass.feedWatts(),
        pass == null ? List.of() : pass.all());
  }
}

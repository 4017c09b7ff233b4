package earward.engine.waveform;

import earward.engine.law.WaveformStage;
import java.util.Arrays;

/**
 * The bare carrier in its periodic state, from which a modulated one starts; a tuned feed is peaked
 * on the way as a builder does it, devices in place, and then detuned by what is asked for. For one
 * thread.
 */
final class Alignment {
  private static final int STEPS = 64;
  private static final int IDLE_CYCLES = 150;
  private static final int ROUNDS = 20;

  /** Share of its bandwidth to which the winding is peaked. */
  private static final double PEAKED = 1e-4;

  private final Stamping stamping;
  private final WaveformTask task;
  private final WaveformListener listener;
  private Stepper stepper;
  private double tuningRadians;

  Alignment(Stamping stamping, WaveformTask task, WaveformListener listener) {
    this.stamping = stamping;
    this.task = task;
    this.listener = listener;
    stepper = stepper(stamping.stamped(0, true), task, STEPS);
  }

  static Stepper stepper(WaveformStage stage, WaveformTask task, int steps) {
    WaveformCircuit circuit = new WaveformCircuit(stage);
    return new Stepper(new StepTables(circuit, 1 / (task.carrierHertz() * steps)));
  }

  /** In its periodic state as far as it got. */
  Stepper stepper() {
    return stepper;
  }

  /** ωc less the resonance of the winding, in rad/s; 0 for an untuned feed. */
  double tuningRadians() {
    return tuningRadians;
  }

  /** Settles on the carrier; peaks where there is what to peak. */
  Shooting.End align() {
    Drive drive = new Drive(task.peakVolts(), 0, 1, STEPS);
    if (!new Periods(stepper, drive).idle(IDLE_CYCLES, listener)) {
      return Shooting.End.CANCELLED;
    }
    if (!task.tuned() || !task.peaked()) {
      return settle(drive, false);
    }
    double bandwidth = 1 / (task.tankFarads() * task.tankOhms());
    for (int round = 0; round < ROUNDS; round++) {
      double former = tuningRadians;
      Shooting.End end = settle(drive, true);
      if (end != Shooting.End.FOUND) {
        return end;
      }
      turn(tuningRadians);
      if (Math.abs(tuningRadians - former) < PEAKED * bandwidth) {
        turn(tuningRadians - task.detuningRadians());
        return task.detuningRadians() == 0 ? end : settle(drive, false);
      }
    }
    return Shooting.End.NOT_FOUND;
  }

  private void turn(double radians) {
    tuningRadians = radians;
    Stepper next = stepper(stamping.stamped(radians, true), task, STEPS);
    next.takeOver(stepper);
    stepper = next;
  }

  /** Runs to the periodic state; moves the tuning to where the winding is in phase. */
  private Shooting.End settle(Drive drive, boolean tune) {
    Reader reader = new Reader(stepper.circuit);
    double[][] shown = rows(reader, task);
    double[][] rows = Arrays.copyOf(shown, shown.length + 1);
    rows[shown.length] = reader.power();
    Gauge gauge = new Gauge(rows, reader.power(), false, STEPS, 1);
    Shooting shooting = new Shooting(stepper, drive, gauge, shown);
    Shooting.End end = shooting.search(listener, 0);
    if (end == Shooting.End.FOUND && tune) {
      // the feed's row is V/Rp and its drive E: the admittance that the drive meets is E/(Rp·V)
      double real = gauge.carrierReal(shown.length);
      double imaginary = gauge.carrierImaginary(shown.length);
      double scale =
          task.peakVolts()
              / (task.tankOhms() * task.tankOhms() * (real * real + imaginary * imaginary));
      tuningRadians += imaginary * scale / (2 * task.tankFarads());
    }
    return end;
  }

  static double[][] rows(Reader reader, WaveformTask task) {
    return task.places().stream()
        .map(place -> reader.between(place.plus(), place.minus()))
        .toArray(double[][]::new);
  }
}

package earward.engine.waveform;

/** Runs whole periods of one drive, measured where a gauge is given. Mutable, for one thread. */
final class Periods {
  private final Stepper stepper;
  private final Drive drive;
  private final Sensitivity sensitivity;
  private boolean failed;

  Periods(Stepper stepper, Drive drive) {
    this.stepper = stepper;
    this.drive = drive;
    sensitivity = new Sensitivity(stepper);
  }

  Sensitivity sensitivity() {
    return sensitivity;
  }

  /** Whether a step of the last run found no solution. */
  boolean failed() {
    return failed;
  }

  /** Runs cycles without looking at them. */
  boolean idle(int cycles, WaveformListener listener) {
    failed = false;
    for (int cycle = 0; cycle < cycles; cycle++) {
      drive.begin(cycle);
      for (int n = 0; n < drive.steps; n++) {
        failed |= !stepper.step(drive.at(n, 0), drive.at(n, 1));
      }
      if (!listener.goesOn(0, 0, (double) cycle / cycles)) {
        return false;
      }
    }
    return true;
  }

  /**
   * Runs one period.
   *
   * @return whether the listener let it go on to its end
   */
  boolean run(Gauge gauge, WaveformListener listener, int shownSteps, int period) {
    failed = false;
    gauge.begin();
    sensitivity.begin(drive.cycles);
    for (int cycle = 0; cycle < drive.cycles; cycle++) {
      drive.begin(cycle);
      boolean follow = sensitivity.follows(cycle);
      if (follow) {
        sensitivity.beginCycle();
      }
      for (int n = 0; n < drive.steps; n++) {
        double end = drive.at(n, 1);
        failed |= !stepper.step(drive.at(n, 0), end);
        gauge.add(stepper, n + 1, end);
        if (follow) {
          sensitivity.step();
        }
      }
      gauge.endCycle(cycle);
      if (follow) {
        sensitivity.endCycle(cycle);
      }
      if (!listener.goesOn(shownSteps, period, (cycle + 1.0) / drive.cycles)) {
        return false;
      }
    }
    gauge.finish();
    return true;
  }
}

package earward.timing;

import earward.block.figure.CaseName;
import earward.engine.CompiledCircuit;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformSettings;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import java.io.IOException;
import java.util.List;

/**
 * One step of the full waveform of a starter kit, all its test points measured: warm, on one core.
 *
 * @param kit the starter kit
 */
record WaveformSteps(String kit) implements Bar {
  /** Steps a second that are wanted. */
  private static final double WANTED = 300_000;

  private static final double WARM_UP_SECONDS = 4;
  private static final double COUNTED_SECONDS = 5;
  private static final double NANOS = 1e9;

  @Override
  public String name() {
    return "one step of the full waveform of " + kit;
  }

  @Override
  public Timed measure(boolean quick) throws IOException {
    try (StarterKit opened = StarterKit.open(kit)) {
      Assembly assembly = opened.assembled();
      CompiledCircuit circuit = KitSolver.compileHeadline(assembly).circuit();
      List<String> places = assembly.testPoints().stream().map(point -> point.place()).toList();
      Counter counter = new Counter(quick ? COUNTED_SECONDS / QUICK_SHARE : COUNTED_SECONDS);
      while (!counter.full) {
        var unused =
            circuit.fullWaveform(
                circuit.nominalValues(), CaseName.TEST, WaveformSettings.of(places), counter);
      }
      double seconds = counter.countedNanos / NANOS / counter.steps;
      return new Timed(name(), seconds, (quick ? QUICK_SLACK : 1) / WANTED);
    }
  }

  /** Counts steps between two calls within a period, once it is warm. */
  private static final class Counter implements WaveformListener {
    private final double wantedNanos;
    private final long start = System.nanoTime();
    private long last;
    private int lastPeriod;
    private long countedNanos;
    private long steps;
    private boolean full;

    Counter(double seconds) {
      wantedNanos = seconds * NANOS;
    }

    @Override
    public boolean goesOn(int stepsPerCycle, int period, double share) {
      long now = System.nanoTime();
      boolean warm = now - start > WARM_UP_SECONDS * NANOS;
      if (warm && stepsPerCycle > 0 && period == lastPeriod) {
        countedNanos += now - last;
        steps += stepsPerCycle;
      }
      last = now;
      lastPeriod = stepsPerCycle > 0 ? period : 0;
      full = countedNanos > wantedNanos;
      return !full;
    }
  }
}

package earward.timing;

import earward.block.figure.CaseName;
import earward.engine.CompiledCircuit;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformSettings;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import java.io.IOException;
import java.util.List;
import java.util.Locale;

/**
 * How long the full waveform takes for one audio period once it stands in its periodic solution, as
 * many times as the batch figures of one kit take: told. The fewest steps that the waveform ever
 * takes of a carrier cycle are counted.
 *
 * @param kit the starter kit
 */
record AgainstWaveform(String kit) implements Bar {
  private static final double NANOS = 1e9;

  @Override
  public String name() {
    return "one audio period of the full waveform of " + kit;
  }

  @Override
  public Timed measure(boolean quick) throws IOException {
    double oneKit = new OneKit(kit).seconds(quick);
    try (StarterKit opened = StarterKit.open(kit)) {
      Assembly assembly = opened.assembled();
      CompiledCircuit circuit = KitSolver.compileHeadline(assembly).circuit();
      List<String> places = assembly.testPoints().stream().map(point -> point.place()).toList();
      Period period = new Period();
      var unused =
          circuit.fullWaveform(
              circuit.nominalValues(), CaseName.TEST, WaveformSettings.of(places), period);
      String told =
          String.format(
              Locale.ROOT,
              "%s, %d steps a carrier cycle, is %.0f times the batch figures of one kit",
              name(),
              period.steps,
              period.seconds / oneKit);
      return new Timed(told, period.seconds, Double.POSITIVE_INFINITY);
    }
  }

  /** Times the second audio period, when all is compiled, and ends the run. */
  private static final class Period implements WaveformListener {
    private static final int TIMED = 2;

    private long start;
    private double firstShare;
    private int steps;
    private double seconds;

    @Override
    public boolean goesOn(int stepsPerCycle, int period, double share) {
      if (stepsPerCycle == 0 || period < TIMED) {
        return true;
      }
      if (steps == 0) {
        steps = stepsPerCycle;
        start = System.nanoTime();
        firstShare = share;
        return true;
      }
      boolean same = stepsPerCycle == steps && period == TIMED;
      if (same && share > firstShare) {
        seconds = (System.nanoTime() - start) / NANOS / (share - firstShare);
      }
      return same;
    }
  }
}

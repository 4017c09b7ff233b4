package earward.engine;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.engine.internal.Plan;
import earward.engine.internal.Run;
import earward.engine.internal.WaveformRun;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** A circuit ready to be solved many times. Immutable; shared by all threads. */
public final class CompiledCircuit {
  private final Plan plan;
  private final List<FigureName> figures;
  private final Map<FigureName, Integer> figureIndex = new HashMap<>();

  CompiledCircuit(Plan plan, List<FigureName> wanted) {
    this.plan = plan;
    figures = List.copyOf(wanted);
    for (int i = 0; i < figures.size(); i++) {
      figureIndex.put(figures.get(i), i);
    }
  }

  /** The values of a row, in order. */
  public List<Slot> slots() {
    return List.copyOf(plan.slots().all());
  }

  /**
   * Index of a slot.
   *
   * @throws IllegalArgumentException when there is none of this name
   */
  public int slot(String name) {
    return plan.slots().of(name);
  }

  /** A fresh row with the nominal values. */
  public double[] nominalValues() {
    return plan.slots().all().stream().mapToDouble(Slot::nominal).toArray();
  }

  /** The figures of a row, in order. */
  public List<FigureName> figures() {
    return figures;
  }

  /**
   * Index of a figure.
   *
   * @throws IllegalArgumentException when it was not asked for
   */
  public int figure(FigureName name) {
    Integer index = figureIndex.get(name);
    if (index == null) {
      throw new IllegalArgumentException("figure " + name + " was not asked for");
    }
    return index;
  }

  /** A solver for one thread. */
  public Solver newSolver() {
    return new Solver(this, new Run(plan));
  }

  /**
   * The figures of one case, of those that were asked for, while one of its values moves. Each row
   * starts from the nominal solution, so that their order changes nothing.
   *
   * @param values a row of values
   * @param caseName the case
   * @param slot what moves, over whatever the case itself says of it
   * @param at the values that it takes
   * @throws IllegalArgumentException when there is no such case or slot
   */
  public SweptFigures sweep(double[] values, CaseName caseName, String slot, double[] at) {
    return new Run(plan).sweep(values, caseName, slot, at, figures);
  }

  /**
   * The small-signal audio response from the envelope of the feed, at no load, to a place, with
   * what the front end leaves of the sidebands.
   *
   * @param values a row of values
   * @param caseName the case whose operating point holds
   * @param place probe or node
   * @param hertz frequencies, above 0
   * @throws IllegalArgumentException when there is no such place
   */
  public Response response(double[] values, CaseName caseName, String place, double[] hertz) {
    return new Run(plan).response(values, caseName, place, hertz);
  }

  /**
   * The full waveform of a case with a signal: the yardstick of its figures, solved at the
   * carrier's own rate without anything of carrier-averaged detection. It takes seconds.
   *
   * @param values a row of values
   * @param caseName a case that a signal drives
   * @param settings places to be measured, and how
   * @param listener is told how it goes on and may end it
   * @throws IllegalArgumentException when there is no such case or place, or no feed
   */
  public WaveformResult fullWaveform(
      double[] values, CaseName caseName, WaveformSettings settings, WaveformListener listener) {
    return new WaveformRun(plan, values, caseName).solve(settings, listener);
  }
}

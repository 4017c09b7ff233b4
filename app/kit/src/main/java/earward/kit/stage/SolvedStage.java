package earward.kit.stage;

import earward.block.figure.CaseName;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import java.util.List;
import java.util.Objects;

/**
 * A stage with its figures.
 *
 * @param stage what is fitted
 * @param partial the kit as it stands then, what the builder connected included
 * @param joints nodes of the cut that are joined to ground, each through a resistor of {@link
 *     #JOINT_OHMS}; empty where the path is whole
 * @param injectedVolts what stands at the far ends of those resistors when the cell is joined in
 *     place of ground; negative where its plus is the end at ground, 0 where no cell is used
 * @param seriesOhms resistor in the plus lead of the supply at the first switch-on; 0 where there
 *     is none
 * @param figures in the cases {@link #AT_REST}, {@link #FIRST_POWER} and {@link #INJECTED}
 */
public record SolvedStage(
    BuildStage stage,
    Assembly partial,
    List<String> joints,
    double injectedVolts,
    double seriesOhms,
    Figures figures) {
  /** The one resistor with which the builder closes every cut: 10 kΩ. */
  public static final double JOINT_OHMS = 10e3;

  /** A fresh alkaline or zinc-carbon cell, nominally. Source: IEC 60086-2, LR6 and R6: 1.5 V. */
  public static final double CELL_VOLTS = 1.5;

  /** The supply on, all joints of the cut to ground, every knob at its upper stop. */
  public static final CaseName AT_REST = named("stage-rest");

  /** The resistor in the supply's lead, every knob at its lower stop. */
  public static final CaseName FIRST_POWER = named("stage-first-power");

  /** At rest, with the cell in place of ground at the joints of the cut. */
  public static final CaseName INJECTED = named("stage-injected");

  public SolvedStage {
    Objects.requireNonNull(stage);
    Objects.requireNonNull(partial);
    joints = List.copyOf(joints);
    Objects.requireNonNull(figures);
  }

  private static CaseName named(String text) {
    return new CaseName(text);
  }
}

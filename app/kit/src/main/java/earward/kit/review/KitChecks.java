package earward.kit.review;

import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.WantedLimits;
import earward.kit.path.Assembly;
import java.util.ArrayList;
import java.util.List;

/**
 * What is wanted of the whole path, as data like the checks of blocks. A figure that a path does
 * not have, since it ends earlier, is not asked for.
 */
public final class KitChecks {
  /** What these checks are about. */
  public static final String SUBJECT = "path";

  private static final String SOURCE = "the kit design's own conditions";

  private KitChecks() {}

  /** The checks of an assembly, in the order in which they are held. */
  public static List<Check> of(Assembly assembly) {
    Conditions core = assembly.design().conditions().core();
    WantedLimits wanted = assembly.design().conditions().wanted();
    List<Check> checks = new ArrayList<>();
    checks.add(
        Check.atMost(
            "path-low-edge",
            Severity.WEIGH,
            figure(Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
            wanted.lowEdgeHertz(),
            SOURCE));
    checks.add(
        Check.atMost(
            "path-distortion",
            Severity.WEIGH,
            figure(Quantity.DISTORTION, CaseName.TEST),
            wanted.distortion(),
            SOURCE));
    if (!endsAtThePowerStage(assembly)) {
      checks.add(
          Check.atLeast(
              "little-output",
              Severity.WEIGH,
              figure(Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT),
              core.wantedWatts(),
              SOURCE));
    }
    wanted
        .batteryHours()
        .ifPresent(
            hours ->
                checks.add(
                    Check.atLeast(
                        "battery-life",
                        Severity.WEIGH,
                        figure(Quantity.BATTERY_HOURS, new CaseName("listening")),
                        hours,
                        SOURCE)));
    return checks;
  }

  /** A power stage without its load gives no output that could be wanted. */
  private static boolean endsAtThePowerStage(Assembly assembly) {
    int blocks = assembly.path().size();
    return blocks > 0 && assembly.path().get(blocks - 1).type().role() == Role.POWER;
  }

  private static FigureName figure(Quantity quantity, CaseName caseName) {
    return new FigureName(SUBJECT, quantity, caseName);
  }
}

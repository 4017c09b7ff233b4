package earward.block.testkit;

import earward.block.check.Check;
import earward.block.check.Relation;
import earward.block.quantity.Unit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a block's checks said in the trial kits: for the author to look at, no fault. Not safe for
 * several threads.
 */
final class HeldInTrial {
  private final Map<String, Tried> tried = new LinkedHashMap<>();

  /** One check over the variations. */
  private record Tried(
      Check check, List<Double> figures, List<Double> limits, List<String> broken) {}

  void add(Check check, double figure, Variation variation) {
    Tried one =
        tried.computeIfAbsent(
            check.code() + " of " + check.figure() + " " + check.relation(),
            key -> new Tried(check, new ArrayList<>(), new ArrayList<>(), new ArrayList<>()));
    if (Double.isNaN(figure)) {
      return;
    }
    one.figures().add(figure);
    one.limits().add(check.limit());
    if (!check.relation().holds(figure, check.limit())) {
      one.broken().add(variation.name());
    }
  }

  /** A line for each check: figure, limit, and whether it holds. */
  List<String> lines() {
    return tried.values().stream().map(HeldInTrial::line).toList();
  }

  private static String line(Tried one) {
    Check check = one.check();
    String name = check.code() + " (" + check.severity() + "): " + check.figure();
    if (one.figures().isEmpty()) {
      return name + " has no figure here, so it is not held";
    }
    Unit unit = check.figure().quantity().unit();
    return name
        + (" is " + Shown.range(one.figures(), unit))
        + (check.relation() == Relation.AT_MOST ? ", wanted at most " : ", wanted at least ")
        + Shown.range(one.limits(), unit)
        + (": " + verdict(one));
  }

  private static String verdict(Tried one) {
    int all = one.figures().size();
    int broken = one.broken().size();
    if (broken == 0) {
      return "holds";
    }
    return broken == all
        ? "DOES NOT HOLD"
        : "DOES NOT HOLD in "
            + broken
            + " of "
            + all
            + " variations, as with "
            + one.broken().get(0);
  }
}

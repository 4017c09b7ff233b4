package earward.command;

import earward.kit.path.Assembly;
import earward.study.matters.FigureShares;
import earward.study.matters.Matters;
import earward.study.matters.ToleranceTrial;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.stream.Collectors;

/** What matters, for people: the parts behind each spread, and other tolerances. */
final class MattersText {
  private static final int PARTS_SHOWN = 4;

  private MattersText() {}

  static void print(PrintWriter to, Assembly assembly, Matters matters) {
    to.println();
    to.println("Which parts make the spread (share of the variance, without lots):");
    TextTable table = new TextTable().row("reading", "parts");
    for (FigureShares each : matters.figures()) {
      table.row(
          each.figure().toString(),
          each.shares().stream()
              .limit(PARTS_SHOWN)
              .map(
                  share ->
                      String.format(
                          Locale.ROOT,
                          "%s %.0f %%",
                          BatchText.reference(assembly, share.part()),
                          100 * share.share()))
              .collect(Collectors.joining(", ")));
    }
    table.print(to);
    for (ToleranceTrial trial : matters.trials()) {
      to.println(
          String.format(
              Locale.ROOT,
              "%s %s %s: yield %s -> %s",
              trial.factor() < 1 ? "Tighten" : "Loosen",
              BatchText.reference(assembly, trial.part()),
              trial.factor() < 1 ? "to half" : "to double",
              BatchText.share(trial.yieldBefore()),
              BatchText.share(trial.yieldAfter())));
    }
  }
}

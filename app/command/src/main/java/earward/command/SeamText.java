package earward.command;

import earward.block.check.Finding;
import earward.block.quantity.Unit;
import earward.kit.proposal.MatchingAction;
import earward.kit.proposal.MatchingAction.Effect;
import java.io.PrintWriter;
import java.util.List;

/** What could be done at a seam, for people: each with what it does. */
final class SeamText {
  private SeamText() {}

  static void print(PrintWriter to, List<MatchingAction> actions, int taken) {
    for (int i = 0; i < actions.size(); i++) {
      MatchingAction action = actions.get(i);
      to.println();
      to.println((i + 1) + (i + 1 == taken ? " (taken) " : " ") + Shown.plain(action.sentence()));
      TextTable table = new TextTable();
      for (Effect effect : action.effects()) {
        Unit unit = effect.figure().quantity().unit();
        table.row(
            effect.figure().toString(),
            Shown.quantity(effect.before(), unit),
            "->",
            Shown.quantity(effect.after(), unit));
      }
      table.print(to);
      findings(to, "clears", action.cleared());
      findings(to, "brings", action.raised());
    }
  }

  private static void findings(PrintWriter to, String what, List<Finding> findings) {
    if (!findings.isEmpty()) {
      to.println(
          what
              + ": "
              + String.join(
                  ", ", findings.stream().map(f -> f.code() + " " + f.subject()).toList()));
    }
  }
}

package earward.command;

import earward.block.quantity.Unit;
import earward.kit.path.ProofRow;
import earward.kit.path.WaveformProof;
import earward.kit.review.ReviewedKit;
import java.io.PrintWriter;
import java.util.Locale;

/** A proof for people: one line a figure, and whether it agrees. */
final class ProofText {
  private ProofText() {}

  static void print(PrintWriter to, ReviewedKit reviewed, WaveformProof proof) {
    to.println(KitHead.line(reviewed));
    to.println();
    to.println(
        "Case "
            + proof.caseName().text()
            + ", tone "
            + hertz(proof.result().toneHertz())
            + " ("
            + proof.result().cyclesPerTone()
            + " carrier cycles; the conditions say "
            + hertz(proof.wantedToneHertz())
            + "), "
            + proof.result().stepsPerCycle()
            + " steps a cycle");
    TextTable table = new TextTable().row("place", "figure", "averaged", "full", "difference", "");
    for (ProofRow row : proof.rows()) {
      table.row(
          row.place(),
          row.quantity().key(),
          Shown.quantity(row.averaged(), row.unit()),
          Shown.quantity(row.full(), row.unit()),
          difference(row),
          row.agrees() ? "" : "BEYOND");
    }
    table.print(to);
    to.println();
    long beyond = proof.rows().stream().filter(row -> !row.agrees()).count();
    to.println(
        beyond == 0
            ? "All figures agree: levels within 0.1 %, distortion within 0.05 points (1 % of itself"
                + " above 10 %), residues within 1 %."
            : beyond + " of " + proof.rows().size() + " figures differ by more than they may.");
  }

  private static String hertz(double hertz) {
    return String.format(Locale.ROOT, "%.2f Hz", hertz);
  }

  /** A share of the figure, or the bare difference where that is held against a floor. */
  private static String difference(ProofRow row) {
    if (row.unit() == Unit.FRACTION) {
      return String.format(Locale.ROOT, "%+.4f points", 100 * row.difference());
    }
    double share = row.difference() / Math.abs(row.full());
    return row.limit() > Math.abs(row.full()) || !(Math.abs(share) < 1)
        ? Shown.quantity(row.difference(), row.unit())
        : String.format(Locale.ROOT, "%+.4f %%", 100 * share);
  }
}

package earward.command;

import earward.block.quantity.Unit;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.ReviewedKit;
import earward.study.batch.BatchResult;
import earward.study.batch.CheckOutcome;
import earward.study.batch.Distribution;
import earward.study.batch.Habits;
import earward.study.batch.ReadingSpread;
import earward.study.batch.WorstKit;
import java.io.PrintWriter;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** A batch for people: yield, findings, spread of each reading, the worst kit. */
final class BatchText {
  private static final int PARTS_SHOWN = 8;

  private BatchText() {}

  static void print(PrintWriter to, ReviewedKit reviewed, BatchResult result) {
    to.println(KitHead.line(reviewed));
    to.println();
    goodKits(to, result);
    to.println();
    findings(to, result);
    to.println();
    readings(to, reviewed.solved().assembly(), result);
    to.println();
    result.worst().ifPresent(worst -> worst(to, reviewed.solved().assembly(), worst));
    Habits habits = result.order().habits();
    to.println(
        String.format(
            Locale.ROOT,
            "Taken for granted: parts evenly within their tolerance, %.0f %% of it common to a bag"
                + " for %d kits; batteries used up by 0 to %.0f %%; a room within %.0f K.",
            100 * habits.lotShare(),
            habits.kitsPerLot(),
            100 * habits.batteryUsed(),
            habits.ambientKelvin()));
  }

  private static void goodKits(PrintWriter to, BatchResult result) {
    to.println(
        String.format(
            Locale.ROOT,
            "%d kits, seed %d: yield %s (95 %% sure: %s to %s): no STOP and every limit wanted"
                + " met.",
            result.kits(),
            result.order().seed(),
            share(result.goodShare()),
            share(result.goodShareBound(false)),
            share(result.goodShareBound(true))));
    if (result.unsolved() > 0) {
      to.println(result.unsolved() + " kits found no solution; they count as failed.");
    }
    if (!result.notLookedAt().isEmpty()) {
      to.println("Not looked at (--full does): " + String.join(", ", result.notLookedAt()) + ".");
    }
  }

  static String share(double fraction) {
    return Shown.quantity(Math.round(fraction * 1e4) / 1e4, Unit.FRACTION);
  }

  private static void findings(PrintWriter to, BatchResult result) {
    TextTable table = new TextTable().row("failed by", "weight", "finding", "limit", "worst kit");
    for (CheckOutcome outcome : result.checks()) {
      if (outcome.failed() > 0) {
        var check = outcome.held().check();
        Unit unit = check.figure().quantity().unit();
        table.row(
            share(outcome.failedShare()),
            check.severity().name() + (outcome.held().forYield() ? "" : ", not in the yield"),
            check.code() + " (" + outcome.held().subject() + ")",
            Shown.quantity(check.limit(), unit),
            Shown.quantity(outcome.worst(), unit));
      }
    }
    if (table.isEmpty()) {
      to.println("No kit fails any of the " + result.checks().size() + " checks.");
    } else {
      table.print(to);
    }
  }

  private static void readings(PrintWriter to, Assembly assembly, BatchResult result) {
    TextTable table =
        new TextTable()
            .row("reading", "at", "nominal", "least", "0.5 %", "median", "99.5 %", "most");
    for (ReadingSpread spread : result.readings()) {
      Distribution kits = spread.distribution();
      if (kits.count() > 0) {
        Unit unit = spread.figure().quantity().unit();
        table.row(
            spread.figure().toString(),
            reference(assembly, spread.figure().place()),
            Shown.quantity(spread.nominal(), unit),
            Shown.quantity(kits.least(), unit),
            Shown.quantity(kits.quantile(0.005), unit),
            Shown.quantity(kits.quantile(0.5), unit),
            Shown.quantity(kits.quantile(0.995), unit),
            Shown.quantity(kits.most(), unit));
      }
    }
    table.print(to);
  }

  static String reference(Assembly assembly, String place) {
    return assembly.testPoints().stream()
        .filter(point -> point.place().equals(place))
        .map(PlacedTestPoint::reference)
        .findFirst()
        .or(() -> assembly.references().ofPart(place))
        .orElse("");
  }

  private static void worst(PrintWriter to, Assembly assembly, WorstKit worst) {
    to.println(
        "Worst kit: number "
            + worst.number()
            + (worst.byCheck().isEmpty()
                ? "."
                : String.format(
                    Locale.ROOT,
                    ", by %s, %.1f standard deviations %s its limit. Its parts farthest off:",
                    worst.byCheck(),
                    Math.abs(worst.margin()),
                    worst.margin() < 0 ? "beyond" : "within")));
    List<PartOff> parts = PartOff.of(assembly, worst);
    TextTable table = new TextTable().row("part", "value", "nominal", "this kit", "off by");
    parts.stream()
        .sorted(Comparator.comparingDouble((PartOff off) -> -Math.abs(off.share())))
        .limit(PARTS_SHOWN)
        .forEach(
            off ->
                table.row(
                    (reference(assembly, off.part()) + " " + off.part()).strip(),
                    off.parameter(),
                    Shown.quantity(off.nominal(), off.unit()),
                    Shown.quantity(off.value(), off.unit()),
                    String.format(Locale.ROOT, "%+.1f %%", 100 * off.share())));
    table.print(to);
    to.println();
  }
}

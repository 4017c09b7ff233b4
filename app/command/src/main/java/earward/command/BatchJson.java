package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.figure.FigureName;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.batch.BatchResult;
import earward.study.batch.CheckOutcome;
import earward.study.batch.Distribution;
import earward.study.batch.ReadingSpread;
import earward.study.batch.WorstKit;
import earward.study.matters.FigureShares;
import earward.study.matters.Matters;
import earward.study.matters.PartShare;
import earward.study.matters.ToleranceTrial;
import java.util.Locale;
import java.util.Optional;

/** A batch, for programs. */
final class BatchJson {
  private static final int BARS = 40;

  private BatchJson() {}

  static ObjectNode of(ReviewedKit reviewed, BatchResult result, Optional<Matters> matters) {
    Assembly assembly = reviewed.solved().assembly();
    ObjectNode root = JsonOut.object().put("schema", "earward-batch-1");
    root.set("kit", KitHead.json(reviewed));
    root.put("kits", result.kits());
    root.put("seed", result.order().seed());
    root.put("full", result.order().full());
    root.set("takenForGranted", habits(result));
    ObjectNode yield = root.putObject("yield");
    yield.put("passed", result.passed());
    yield.put("unsolved", result.unsolved());
    JsonOut.put(yield, "share", result.goodShare());
    JsonOut.put(yield, "leastShare95", result.goodShareBound(false));
    JsonOut.put(yield, "mostShare95", result.goodShareBound(true));
    ArrayNode left = root.putArray("checksNotLookedAt");
    result.notLookedAt().forEach(left::add);
    ArrayNode checks = root.putArray("checks");
    result.checks().forEach(outcome -> checks.add(check(outcome)));
    ArrayNode readings = root.putArray("readings");
    result.readings().stream()
        .filter(spread -> spread.distribution().count() > 0)
        .forEach(spread -> readings.add(reading(assembly, spread)));
    result
        .worst()
        .ifPresentOrElse(
            worst -> root.set("worstKit", worst(assembly, worst)), () -> root.putNull("worstKit"));
    matters.ifPresentOrElse(
        what -> root.set("matters", matters(what)), () -> root.putNull("matters"));
    return root;
  }

  private static ObjectNode matters(Matters matters) {
    ObjectNode node = JsonOut.object();
    ArrayNode figures = node.putArray("figures");
    for (FigureShares each : matters.figures()) {
      ObjectNode one = figures.addObject().put("figure", each.figure().toString());
      ArrayNode shares = one.putArray("shares");
      for (PartShare share : each.shares()) {
        ObjectNode part =
            shares.addObject().put("place", share.part()).put("parameter", share.parameter());
        JsonOut.put(part, "share", share.share());
      }
    }
    ArrayNode trials = node.putArray("tolerances");
    for (ToleranceTrial trial : matters.trials()) {
      ObjectNode one = trials.addObject().put("place", trial.part());
      JsonOut.put(one, "factor", trial.factor());
      JsonOut.put(one, "yieldBefore", trial.yieldBefore());
      JsonOut.put(one, "yieldAfter", trial.yieldAfter());
    }
    return node;
  }

  private static ObjectNode habits(BatchResult result) {
    ObjectNode node = JsonOut.object();
    node.put("kitsPerLot", result.order().habits().kitsPerLot());
    JsonOut.put(node, "lotShare", result.order().habits().lotShare());
    JsonOut.put(node, "batteryUsedShare", result.order().habits().batteryUsed());
    JsonOut.put(node, "ambientKelvin", result.order().habits().ambientKelvin());
    return node;
  }

  private static ObjectNode check(CheckOutcome outcome) {
    var check = outcome.held().check();
    ObjectNode node =
        JsonOut.object()
            .put("code", check.code())
            .put("subject", outcome.held().subject())
            .put("severity", check.severity().name())
            .put("inYield", outcome.held().forYield())
            .put("figure", check.figure().toString())
            .put("unit", unit(check.figure()))
            .put("relation", check.relation().name().toLowerCase(Locale.ROOT).replace('_', '-'));
    JsonOut.put(node, "limit", check.limit());
    node.put("kits", outcome.kits()).put("failed", outcome.failed());
    JsonOut.put(node, "nominal", outcome.nominal());
    JsonOut.put(node, "worst", outcome.worst());
    return node;
  }

  private static ObjectNode reading(Assembly assembly, ReadingSpread spread) {
    Distribution kits = spread.distribution();
    ObjectNode node =
        JsonOut.object()
            .put("figure", spread.figure().toString())
            .put("reference", BatchText.reference(assembly, spread.figure().place()))
            .put("unit", unit(spread.figure()));
    JsonOut.put(node, "nominal", spread.nominal());
    node.put("kits", kits.count());
    JsonOut.put(node, "mean", kits.mean());
    JsonOut.put(node, "standardDeviation", kits.standardDeviation());
    JsonOut.put(node, "least", kits.least());
    JsonOut.put(node, "quantile005", kits.quantile(0.005));
    JsonOut.put(node, "quantile05", kits.quantile(0.05));
    JsonOut.put(node, "median", kits.quantile(0.5));
    JsonOut.put(node, "quantile95", kits.quantile(0.95));
    JsonOut.put(node, "quantile995", kits.quantile(0.995));
    JsonOut.put(node, "most", kits.most());
    JsonOut.put(node, "quantileError", kits.quantileError());
    ArrayNode bars = node.putArray("histogram");
    kits.bars(BARS).forEach(bars::add);
    return node;
  }

  private static ObjectNode worst(Assembly assembly, WorstKit worst) {
    ObjectNode node = JsonOut.object().put("number", worst.number()).put("by", worst.byCheck());
    JsonOut.put(node, "marginStandardDeviations", worst.margin());
    ArrayNode values = node.putArray("values");
    for (PartOff off : PartOff.of(assembly, worst)) {
      ObjectNode value =
          values
              .addObject()
              .put("place", off.part())
              .put("reference", BatchText.reference(assembly, off.part()))
              .put("parameter", off.parameter());
      JsonOut.put(value, "nominal", off.nominal());
      JsonOut.put(value, "value", off.value());
    }
    ObjectNode figures = node.putObject("figures");
    worst.figures().forEach((name, value) -> JsonOut.put(figures, name.toString(), value));
    return node;
  }

  static String unit(FigureName figure) {
    return figure.quantity().unit().name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}

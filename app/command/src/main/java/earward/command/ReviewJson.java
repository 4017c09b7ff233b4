package earward.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.figure.Quantity;
import earward.kit.path.Figures;
import earward.kit.review.ClippingCause;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import java.util.Locale;
import java.util.Optional;

/** The findings of a review, for programs. */
final class ReviewJson {
  private ReviewJson() {}

  static ObjectNode of(ReviewedKit reviewed) {
    ObjectNode root = JsonOut.object().put("schema", "earward-review-1");
    root.set("kit", KitHead.json(reviewed));
    root.put("doNotBuild", reviewed.doNotBuild());
    root.set("findings", findings(reviewed));
    return root;
  }

  static ArrayNode findings(ReviewedKit reviewed) {
    ArrayNode findings = JsonOut.object().arrayNode();
    for (ReviewFinding found : reviewed.findings()) {
      findings.add(finding(found, reviewed.figures()));
    }
    return findings;
  }

  private static ObjectNode finding(ReviewFinding found, Figures figures) {
    Finding finding = found.finding();
    ObjectNode node =
        JsonOut.object()
            .put("severity", finding.severity().name())
            .put("code", finding.code())
            .put("subject", finding.subject())
            .put("sentence", Shown.plain(finding.sentence()))
            .put("source", Shown.plain(finding.source()));
    finding.measured().ifPresent(measured -> node.set("measured", measured(measured)));
    finding
        .measured()
        .flatMap(measured -> cause(measured, figures))
        .ifPresent(cause -> node.put("cause", cause.key()));
    ArrayNode remedies = node.putArray("remedies");
    found.remedies().forEach(remedy -> remedies.add(Shown.plain(remedy.sentence())));
    return node;
  }

  private static Optional<ClippingCause> cause(Measured measured, Figures figures) {
    return measured.figure().quantity() == Quantity.CLIPPING_DEPTH
        ? ClippingCause.of(figures, measured.figure().place(), measured.figure().caseName())
        : Optional.empty();
  }

  private static ObjectNode measured(Measured measured) {
    ObjectNode node = JsonOut.object().put("figure", measured.figure().toString());
    JsonOut.put(node, "value", measured.value());
    JsonOut.put(node, "limit", measured.limit());
    return node.put(
        "unit",
        measured.figure().quantity().unit().name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }
}

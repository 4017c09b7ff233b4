package earward.kit.review;

import earward.block.BlockTexts;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.check.Relation;
import earward.block.check.Severity;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Figures;
import earward.kit.path.SolvedKit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** All checks of a kit, its blocks' and its own, held against its figures. */
final class HeldChecks {
  private final SolvedKit solved;
  private final Figures figures;
  private final Locale language;
  private final KitTexts texts;

  HeldChecks(SolvedKit solved, Locale language) {
    this.solved = solved;
    this.figures = solved.figures();
    this.language = language;
    this.texts = new KitTexts(language);
  }

  List<Finding> findings() {
    List<Finding> findings = new ArrayList<>();
    for (KitCheck each : KitChecks.of(solved.assembly())) {
      held(each).ifPresent(findings::add);
    }
    return SaidOnce.of(findings, solved.assembly());
  }

  private Optional<Finding> held(KitCheck kitCheck) {
    Check check = kitCheck.check();
    String subject = kitCheck.subject();
    double value = kitCheck.figure(figures);
    if (Double.isNaN(value)) {
      return kitCheck.ofBlock() ? notHeld(check, subject) : Optional.empty();
    }
    if (check.relation().holds(value, check.limit())) {
      return Optional.empty();
    }
    ShownPair shown =
        ShownPair.of(value, check.limit(), check.figure().quantity().unit(), language);
    String sentence =
        words(kitCheck)
            .replace("{figure}", shown.figure())
            .replace("{limit}", shown.limit())
            .replace("{place}", subject);
    return Optional.of(
        new Finding(
            check.severity(),
            check.code(),
            subject,
            sentence + cause(check.figure()),
            check.source(),
            Optional.of(new Measured(check.figure(), value, check.limit()))));
  }

  private String words(KitCheck kitCheck) {
    String key = "check." + kitCheck.check().code();
    return solved
        .assembly()
        .block(kitCheck.subject())
        .filter(block -> kitCheck.ofBlock())
        .map(block -> BlockTexts.of(block.type(), language).get(key))
        .orElseGet(() -> texts.get(key).replace("{part}", kitCheck.part()));
  }

  /** An edge that does not exist cannot lie wrong; anything else that is missing is said. */
  private Optional<Finding> notHeld(Check check, String subject) {
    Quantity quantity = check.figure().quantity();
    boolean noEdge =
        (quantity == Quantity.LOW_EDGE_HERTZ && check.relation() == Relation.AT_MOST)
            || (quantity == Quantity.HIGH_EDGE_HERTZ && check.relation() == Relation.AT_LEAST);
    if (noEdge || !solved.solved()) {
      return Optional.empty();
    }
    return Optional.of(
        Finding.of(
            Severity.NOTE,
            "check-not-held",
            subject,
            texts
                .get("not-held")
                .replace("{check}", check.code())
                .replace("{place}", subject)
                .replace("{figure}", check.figure().toString())));
  }

  private String cause(FigureName figure) {
    if (figure.quantity() != Quantity.CLIPPING_DEPTH) {
      return "";
    }
    return ClippingCause.of(figures, figure.place(), figure.caseName())
        .map(cause -> " " + texts.get("cause." + cause.key()) + knobs())
        .orElse("");
  }

  private String knobs() {
    StringBuilder words = new StringBuilder();
    solved
        .deepestKnobs()
        .forEach(
            (slot, position) ->
                words
                    .append(' ')
                    .append(
                        texts
                            .get("knob")
                            .replace("{place}", slot.substring(0, slot.indexOf('.')))
                            .replace("{position}", Math.round(position * 100) + "\u202f%")));
    return words.toString();
  }
}

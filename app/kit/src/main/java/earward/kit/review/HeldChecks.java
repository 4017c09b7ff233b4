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
import earward.kit.path.PlacedBlock;
import earward.kit.path.SolvedKit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** All checks of a kit, its blocks' and its own, held against its figures. */
final class HeldChecks {
  /** Two figures this close are one and the same edge, seen at two places of the path. */
  private static final double SAME = 1e-6;

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
    for (PlacedBlock block : solved.assembly().blocks()) {
      BlockTexts words = BlockTexts.of(block.type(), language);
      for (Check check : block.description().checks()) {
        held(block.global(check), block.id(), words.get("check." + check.code()))
            .ifPresent(findings::add);
      }
    }
    for (Check check : KitChecks.of(solved.assembly())) {
      if (value(check.figure()).isPresent()) {
        held(check, KitChecks.SUBJECT, texts.get("check." + check.code())).ifPresent(findings::add);
      }
    }
    return sayingNothingTwice(findings);
  }

  /** A block's own place stands for the seam by which it is entered. */
  private Optional<Double> value(FigureName name) {
    FigureName atSeam = new FigureName("seam." + name.place(), name.quantity(), name.caseName());
    double own = figures.orNaN(name);
    double value = Double.isNaN(own) ? figures.orNaN(atSeam) : own;
    return Double.isNaN(value) ? Optional.empty() : Optional.of(value);
  }

  private Optional<Finding> held(Check check, String subject, String words) {
    Optional<Double> value = value(check.figure());
    if (value.isEmpty()) {
      return notHeld(check, subject);
    }
    if (check.relation().holds(value.get(), check.limit())) {
      return Optional.empty();
    }
    ShownPair shown =
        ShownPair.of(value.get(), check.limit(), check.figure().quantity().unit(), language);
    String sentence =
        words
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
            Optional.of(new Measured(check.figure(), value.get(), check.limit()))));
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

  /** The same edge seen again further along the path, and at its end, is one finding. */
  private static List<Finding> sayingNothingTwice(List<Finding> findings) {
    List<Finding> kept = new ArrayList<>();
    for (Finding finding : findings) {
      if (kept.stream().noneMatch(earlier -> sameEdge(earlier, finding))) {
        kept.add(finding);
      }
    }
    return kept;
  }

  private static boolean sameEdge(Finding earlier, Finding later) {
    if (earlier.measured().isEmpty() || later.measured().isEmpty()) {
      return false;
    }
    Measured one = earlier.measured().get();
    Measured other = later.measured().get();
    Quantity quantity = one.figure().quantity();
    boolean edge = quantity == Quantity.LOW_EDGE_HERTZ || quantity == Quantity.HIGH_EDGE_HERTZ;
    return edge
        && quantity == other.figure().quantity()
        && one.figure().caseName().equals(other.figure().caseName())
        && Math.abs(one.value() - other.value()) <= SAME * Math.abs(one.value());
  }
}

package earward.desktop.model;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembly;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewedKit;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What was solved so far, and for which design. Immutable.
 *
 * @param reviewed the last whole review; of the present design only where settled
 * @param good the last review whose kit was solved
 * @param headline the headline figures of the design that is shown, ahead of its review
 * @param settled whether the review is of the present design
 * @param drafted whether something is being typed that is no edit yet
 * @param fault why the present design could not be solved; empty where nothing failed
 */
public record Readings(
    Optional<ReviewedKit> reviewed,
    Optional<ReviewedKit> good,
    Optional<SolvedKit> headline,
    boolean settled,
    boolean drafted,
    String fault) {
  /** Nothing was solved yet. */
  public static final Readings NONE =
      new Readings(Optional.empty(), Optional.empty(), Optional.empty(), false, false, "");

  public Readings {
    Objects.requireNonNull(reviewed);
    Objects.requireNonNull(good);
    Objects.requireNonNull(headline);
    Objects.requireNonNull(fault);
  }

  /** The design changed: what is here is of its forerunner. */
  Readings edited() {
    return new Readings(reviewed, good, headline, false, false, "");
  }

  /** Something is typed: what is here is of the design without it. */
  Readings typed() {
    return new Readings(reviewed, good, headline, settled, true, "");
  }

  /** What was typed is no more; the review, if it was settled, holds again. */
  Readings untyped() {
    return new Readings(
        reviewed, good, settled ? Optional.empty() : headline, settled, false, fault);
  }

  /** The headline figures have come. */
  Readings withHeadline(SolvedKit kit) {
    boolean useful = kit.assembly().complete() && kit.solved();
    return new Readings(
        reviewed, good, useful ? Optional.of(kit) : headline, settled, drafted, fault);
  }

  /** The whole review has come. */
  Readings withReview(ReviewedKit kit) {
    return new Readings(
        Optional.of(kit),
        kit.solved().solved() ? Optional.of(kit) : good,
        drafted ? headline : Optional.empty(),
        true,
        drafted,
        "");
  }

  /** The present design could not be solved. */
  Readings failed(String why) {
    return new Readings(reviewed, good, headline, settled, drafted, why);
  }

  /** The assembly that is nearest to what is shown. */
  public Optional<Assembly> assembly() {
    Optional<Assembly> ahead = headline.map(SolvedKit::assembly);
    Optional<Assembly> whole = reviewed.map(kit -> kit.solved().assembly());
    return settled && !drafted ? whole.or(() -> ahead) : ahead.or(() -> whole);
  }

  /** Whether the headline figures are those of a design. */
  public boolean headlineOf(KitDesign design) {
    return headline.filter(kit -> kit.assembly().design().equals(design)).isPresent();
  }

  /** A figure, from the best there is. */
  public ShownFigure find(String place, Quantity quantity, CaseName caseName) {
    return find(new FigureName(place, quantity, caseName));
  }

  /** A figure, from the best there is. */
  public ShownFigure find(FigureName name) {
    OptionalDouble whole = figure(reviewed, name);
    if (settled && !drafted && whole.isPresent()) {
      return new ShownFigure(whole.getAsDouble(), Standing.SETTLED);
    }
    if (settled && !drafted && reviewed.filter(kit -> kit.solved().solved()).isPresent()) {
      return ShownFigure.NONE;
    }
    OptionalDouble ahead =
        headline.map(kit -> kit.figures().find(name)).orElse(OptionalDouble.empty());
    if (ahead.isPresent()) {
      return new ShownFigure(ahead.getAsDouble(), Standing.PROVISIONAL);
    }
    OptionalDouble former = figure(good, name);
    return former.isPresent()
        ? new ShownFigure(former.getAsDouble(), Standing.FORMER)
        : ShownFigure.NONE;
  }

  private static OptionalDouble figure(Optional<ReviewedKit> kit, FigureName name) {
    return kit.map(reviewed -> reviewed.figures().find(name)).orElse(OptionalDouble.empty());
  }

  /** The least settled standing of what is shown. */
  public Standing standing() {
    if (settled && !drafted) {
      return reviewed.filter(kit -> kit.solved().solved()).isPresent()
          ? Standing.SETTLED
          : good.isPresent() ? Standing.FORMER : Standing.NONE;
    }
    return headline.isPresent()
        ? Standing.PROVISIONAL
        : good.isPresent() ? Standing.FORMER : Standing.NONE;
  }
}

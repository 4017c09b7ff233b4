package earward.block.check;

import earward.block.figure.FigureName;
import java.util.List;
import java.util.Objects;

/**
 * One thing that must hold, as data: figure, relation, limit. Which figures there are, in which
 * cases, says {@link earward.block.figure}. No plug-in code runs when it is judged. Its sentence is
 * the block's text {@code check.CODE}, with {@code {figure}}, {@code {limit}} and {@code {place}}
 * filled in by the host.
 *
 * @param code stable, lower case with hyphens, for instance {@code clipping-depth}
 * @param severity what a failure weighs
 * @param figure local to the block
 * @param relation how the figure must stand to the limit
 * @param limit in the unit of the figure's quantity
 * @param source where the limit comes from
 * @param remedies where to turn when it fails, best first
 */
public record Check(
    String code,
    Severity severity,
    FigureName figure,
    Relation relation,
    double limit,
    String source,
    List<RemedyHint> remedies) {
  public Check {
    Objects.requireNonNull(severity);
    Objects.requireNonNull(figure);
    Objects.requireNonNull(relation);
    remedies = List.copyOf(remedies);
    if (!code.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "'" + code + "' is no check code; wanted lower case words joined by hyphens");
    }
    if (Double.isNaN(limit)) {
      throw new IllegalArgumentException("the limit of check " + code + " is not a number");
    }
    if (source.isBlank()) {
      throw new IllegalArgumentException("check " + code + " names no source");
    }
  }

  /** The figure must be at most the limit. */
  public static Check atMost(
      String code,
      Severity severity,
      FigureName figure,
      double limit,
      String source,
      RemedyHint... remedies) {
    return new Check(code, severity, figure, Relation.AT_MOST, limit, source, List.of(remedies));
  }

  /** The figure must be at least the limit. */
  public static Check atLeast(
      String code,
      Severity severity,
      FigureName figure,
      double limit,
      String source,
      RemedyHint... remedies) {
    return new Check(code, severity, figure, Relation.AT_LEAST, limit, source, List.of(remedies));
  }
}

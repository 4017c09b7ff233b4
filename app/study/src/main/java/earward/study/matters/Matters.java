package earward.study.matters;

import java.util.List;

/**
 * Which parts matter.
 *
 * @param figures shares of each figure that moves
 * @param trials other tolerances and their yield: parts whose tightening raises it, the best first,
 *     then parts that may be loosened
 */
public record Matters(List<FigureShares> figures, List<ToleranceTrial> trials) {
  public Matters {
    figures = List.copyOf(figures);
    trials = List.copyOf(trials);
  }
}

package earward.study.matters;

import earward.block.figure.FigureName;
import java.util.List;
import java.util.Objects;

/**
 * Which parts make the spread of a figure.
 *
 * @param figure its name
 * @param shares the largest first; what is missing to 1 is state of battery, temperature, and what
 *     parts do together
 */
public record FigureShares(FigureName figure, List<PartShare> shares) {
  public FigureShares {
    Objects.requireNonNull(figure);
    shares = List.copyOf(shares);
  }
}

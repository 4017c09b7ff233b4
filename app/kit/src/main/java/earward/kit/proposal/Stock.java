package earward.kit.proposal;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The values that a designer has at hand: resistances and capacitances. Where none of a kind are
 * named, all of the preferred series are.
 *
 * @param values by unit, in no order
 */
public record Stock(Map<Unit, List<Double>> values) {
  /** Every preferred value. */
  public static final Stock EVERYTHING = new Stock(Map.of());

  /** Two values this close are the same part. */
  private static final double SAME = 1e-3;

  public Stock {
    Map<Unit, List<Double>> copy = new EnumMap<>(Unit.class);
    values.forEach((unit, list) -> copy.put(unit, List.copyOf(list)));
    values = Map.copyOf(copy);
  }

  /**
   * The stock that a text lists, one value a line, {@code 4.7 kΩ} or {@code 100 nF}; what follows a
   * {@code #} is a remark.
   *
   * @throws QuantityException with one sentence that names the line, when it is neither
   */
  public static Stock of(List<String> lines) throws QuantityException {
    Map<Unit, List<Double>> found = new EnumMap<>(Unit.class);
    for (int i = 0; i < lines.size(); i++) {
      String words = lines.get(i).split("#", 2)[0].strip();
      if (!words.isEmpty()) {
        Unit unit = words.endsWith("F") ? Unit.FARAD : Unit.OHM;
        try {
          double value = QuantityText.parse(words, unit);
          found.computeIfAbsent(unit, none -> new ArrayList<>()).add(value);
        } catch (QuantityException e) {
          throw new QuantityException("line " + (i + 1) + ": " + e.sentence());
        }
      }
    }
    return new Stock(found);
  }

  /** Whether a value is at hand. */
  public boolean has(double value, Unit unit) {
    return nearest(value, unit).filter(near -> Math.abs(near / value - 1) <= SAME).isPresent();
  }

  /** The value at hand that is nearest by ratio; the value itself where any may be bought. */
  public Optional<Double> nearest(double value, Unit unit) {
    List<Double> list = values.get(unit);
    if (list == null) {
      return Optional.of(value);
    }
    double best = Double.NaN;
    for (double each : list) {
      if (Double.isNaN(best)
          || Math.abs(Math.log(each / value)) < Math.abs(Math.log(best / value))) {
        best = each;
      }
    }
    return Double.isNaN(best) ? Optional.empty() : Optional.of(best);
  }
}

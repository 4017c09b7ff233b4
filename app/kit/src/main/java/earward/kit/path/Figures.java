package earward.kit.path;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.Collections;
import java.util.Comparator;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;

/** The figures of a solved kit by name. Immutable; figures that do not exist are not in it. */
public final class Figures {
  private static final Comparator<FigureName> BY_NAME =
      Comparator.comparing(FigureName::place)
          .thenComparing(FigureName::quantity)
          .thenComparing(name -> name.caseName().text());

  /** No figures; made after the order that it needs. */
  public static final Figures NONE = new Figures(Map.of());

  private final SortedMap<FigureName, Double> byName;

  /** These figures; what is not a number is left out. */
  public Figures(Map<FigureName, Double> figures) {
    TreeMap<FigureName, Double> sorted = new TreeMap<>(BY_NAME);
    figures.forEach(
        (name, value) -> {
          if (!Double.isNaN(value)) {
            sorted.put(name, value);
          }
        });
    byName = Collections.unmodifiableSortedMap(sorted);
  }

  /** The figure of this name, in the SI unit of its quantity. */
  public OptionalDouble find(FigureName name) {
    Double value = byName.get(name);
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }

  /** The figure of this place, quantity and case. */
  public OptionalDouble find(String place, Quantity quantity, CaseName caseName) {
    return find(new FigureName(place, quantity, caseName));
  }

  /** The figure of this name, NaN where there is none. */
  public double orNaN(FigureName name) {
    return find(name).orElse(Double.NaN);
  }

  /** All of them, by place, then quantity, then case. */
  public SortedMap<FigureName, Double> all() {
    return byName;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Figures figures && figures.byName.equals(byName);
  }

  @Override
  public int hashCode() {
    return byName.hashCode();
  }

  @Override
  public String toString() {
    return byName.toString();
  }
}

package earward.study.faults;

import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * One thing that a builder may have got wrong, as values of slots.
 *
 * @param id {@code volume.r1:open}: the part and what is wrong with it
 * @param parts places of the parts that it is about, the first one first
 * @param kind its family
 * @param words what is wrong, in English, without the part: {@code is open}
 * @param values what it sets, by slot
 * @param prior its probability, given that there is one fault
 */
public record Fault(
    String id,
    List<String> parts,
    FaultClass kind,
    String words,
    Map<String, Double> values,
    double prior) {
  public Fault {
    Objects.requireNonNull(id);
    Objects.requireNonNull(kind);
    Objects.requireNonNull(words);
    parts = List.copyOf(parts);
    values = Map.copyOf(values);
    if (parts.isEmpty()) {
      throw new IllegalArgumentException("the fault " + id + " is about no part");
    }
  }

  /** This fault with another probability. */
  Fault with(double changed) {
    return new Fault(id, parts, kind, words, values, changed);
  }
}

package earward.sheet.content;

import java.util.Objects;

/**
 * One line of the parts list.
 *
 * @param group heading above the first row of each group, the block's name
 * @param reference for instance R7
 * @param value as it is ordered: a quantity, or a part type
 * @param rating what else must be ordered: tolerance, rated voltage, taper; may be empty
 * @param marking what is seen on the part
 * @param purpose what it is in its block
 * @param fitting which way round it goes, heat sink and whatever else the builder must know
 */
public record PartRow(
    String group,
    String reference,
    String value,
    String rating,
    PartMarking marking,
    String purpose,
    String fitting) {
  public PartRow {
    Objects.requireNonNull(group);
    Objects.requireNonNull(value);
    Objects.requireNonNull(rating);
    Objects.requireNonNull(marking);
    Objects.requireNonNull(purpose);
    Objects.requireNonNull(fitting);
    if (reference.isBlank()) {
      throw new IllegalArgumentException("a row of the parts list has a reference");
    }
  }
}

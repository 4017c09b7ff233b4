package earward.drawing;

import java.util.Objects;

/**
 * What is written beside a part on the drawing.
 *
 * @param reference for instance R7
 * @param value for instance 4.7 kΩ; empty where there is none
 */
public record PartLabel(String reference, String value) {
  public PartLabel {
    Objects.requireNonNull(reference);
    Objects.requireNonNull(value);
  }
}

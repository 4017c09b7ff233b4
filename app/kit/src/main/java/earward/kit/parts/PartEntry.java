package earward.kit.parts;

import earward.block.device.PartModel;
import earward.block.device.Pin;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * One entry of the parts library.
 *
 * @param model the figures
 * @param source where they are from, in words
 * @param fromMemory whether any of it is from memory, not checked against a data sheet
 * @param notes what a designer should know, each one sentence
 * @param fit how the figures were fitted, where they were
 * @param packageName for instance TO-92; empty where the model says it or none is known
 * @param pins the pin-out, in order; empty where none is known
 */
public record PartEntry(
    PartModel model,
    String source,
    boolean fromMemory,
    List<String> notes,
    Optional<FitReport> fit,
    String packageName,
    List<Pin> pins) {
  /** What stands as source where nothing was at hand. */
  public static final String FROM_MEMORY = "from memory, not checked against a data sheet";

  public PartEntry {
    Objects.requireNonNull(model);
    Objects.requireNonNull(fit);
    Objects.requireNonNull(packageName);
    notes = List.copyOf(notes);
    pins = List.copyOf(pins);
    if (source.isBlank()) {
      throw new IllegalArgumentException(model.name() + " names no source");
    }
  }
}

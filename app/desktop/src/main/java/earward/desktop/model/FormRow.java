package earward.desktop.model;

import earward.block.device.PartKind;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * One line of a form.
 *
 * @param owner what the form is of: a block's id, or one of {@link Selection}'s own
 * @param id of the line in its form
 * @param label its name
 * @param help what is to be said of it; may be empty
 * @param words as it stands, or the usual words
 * @param usual whether the design says nothing of it
 * @param input how it is entered
 * @param locked whether proposals leave it alone
 */
public record FormRow(
    String owner,
    String id,
    String label,
    String help,
    String words,
    boolean usual,
    Input input,
    boolean locked) {
  /** How a line is entered. */
  public sealed interface Input {}

  /** A number with a unit. */
  public record Amount(Unit unit, Series series, double least, double most) implements Input {}

  /** One of several words, each with what it is called. */
  public record Choice(List<String> options, List<String> labels) implements Input {
    public Choice {
      options = List.copyOf(options);
      labels = List.copyOf(labels);
    }
  }

  /** A part of the library, by name; or one given by its own figures. */
  public record Part(PartKind kind, List<String> names) implements Input {
    public Part {
      names = List.copyOf(names);
    }
  }

  /** Any words. */
  public record Text() implements Input {}

  public FormRow {
    Objects.requireNonNull(input);
  }

  /** The name of its field: owner and id. */
  public String name() {
    return owner + "." + id;
  }

  /** The unit of a number. */
  public Optional<Unit> unit() {
    return input instanceof Amount number ? Optional.of(number.unit()) : Optional.empty();
  }

  /** Whether a proposal could change it, so that it can be locked against one. */
  public boolean lockable() {
    return !owner.startsWith("#") && !(input instanceof Text);
  }
}

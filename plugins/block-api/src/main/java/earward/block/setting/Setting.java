package earward.block.setting;

import earward.block.device.PartKind;
import earward.block.figure.FigureName;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import java.util.List;
import java.util.Set;

/**
 * What a designer may set on a block. Its label is the block's text {@code setting.ID}, its help
 * {@code setting.ID.help}. All settings of a block are always shown and always have a value, also
 * those for which a choice leaves no use: none can be hidden. Say in the help under which choice it
 * counts.
 */
public sealed interface Setting {
  /** Local to the block: letters, digits and hyphens. */
  String id();

  /**
   * A number.
   *
   * @param id local name
   * @param unit in which it is held
   * @param usual value of a new block
   * @param least lowest that makes sense
   * @param most highest that makes sense; may be infinite
   * @param series by which it steps
   */
  record Value(String id, Unit unit, double usual, double least, double most, Series series)
      implements Setting {
    public Value {
      requireId(id);
      if (!(least <= usual && usual <= most) || Double.isInfinite(usual)) {
        throw new IllegalArgumentException(
            "setting '" + id + "': " + usual + " is not from " + least + " to " + most);
      }
    }
  }

  /**
   * One of several words; the choice may change the wiring. The text of an option is {@code
   * setting.ID.OPTION}.
   *
   * @param id local name
   * @param options at least one; the first is that of a new block
   */
  record Choice(String id, List<String> options) implements Setting {
    public Choice {
      requireId(id);
      options = List.copyOf(options);
      if (options.isEmpty()) {
        throw new IllegalArgumentException("setting '" + id + "' has no options");
      }
      if (Set.copyOf(options).size() < options.size()) {
        throw new IllegalArgumentException(
            "setting '" + id + "' has an option twice; its options are " + options);
      }
    }
  }

  /**
   * A part from the library, or one given inline.
   *
   * @param id local name
   * @param kind of part
   * @param usual name in the parts library for a new block, letter by letter as the {@code name} of
   *     an entry of that kind in {@code templates/parts/}: {@code "BC547B"} in {@code
   *     transistors.json}
   */
  record Part(String id, PartKind kind, String usual) implements Setting {
    public Part {
      requireId(id);
      if (usual.isBlank()) {
        throw new IllegalArgumentException(
            "setting '" + id + "' names no usual part; wanted a name of the parts library");
      }
    }
  }

  /**
   * A knob that the listener turns: swept, never an edit.
   *
   * @param id local name
   * @param usual position in the test case, from 0 to 1
   * @param partId the potentiometer that it turns
   */
  record Position(String id, double usual, String partId) implements Setting {
    public Position {
      requireId(id);
      requireId(partId);
      if (!(usual >= 0 && usual <= 1)) {
        throw new IllegalArgumentException(
            "setting '" + id + "': position " + usual + " is not from 0 to 1");
      }
    }
  }

  /**
   * What the builder turns until a named reading meets its target: solved per kit, printed as a
   * step.
   *
   * @param id local name
   * @param partId the trimmer that it turns
   * @param reading local figure that is watched
   * @param usualTarget what it is to read
   */
  record Trim(String id, String partId, FigureName reading, double usualTarget) implements Setting {
    public Trim {
      requireId(id);
      requireId(partId);
      if (!Double.isFinite(usualTarget)) {
        throw new IllegalArgumentException(
            "setting '" + id + "' has the target " + usualTarget + "; wanted a finite number");
      }
    }
  }

  private static void requireId(String id) {
    if (!id.matches("[A-Za-z0-9]+(-[A-Za-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "a setting or its part is named '" + id + "'; wanted letters, digits and single hyphens");
    }
  }
}

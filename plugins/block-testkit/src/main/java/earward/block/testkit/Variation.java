package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.setting.Values;
import java.util.Objects;
import java.util.Optional;

/**
 * One set of settings in which a block is tried.
 *
 * @param name what is particular about it, for messages
 * @param values all settings
 * @param conditions what the kit must work under
 */
public record Variation(String name, Values values, Conditions conditions) {

  /** How the name of a variation begins whose values are those of a new block. */
  static final String USUAL = "usual values";

  /** Conditions of a plain medium-wave receiver, for tries. */
  public static final Conditions PLAIN_CONDITIONS =
      new Conditions(455e3, 400, 4.5e3, 150, 0.3, 0.8, 0.15, 1.2, 3, 25, 40, 0.1);

  public Variation {
    Objects.requireNonNull(name);
    Objects.requireNonNull(values);
    Objects.requireNonNull(conditions);
  }

  /** Whether all values stand as in a new block; choices and parts may differ. */
  boolean usual() {
    return name.startsWith(USUAL);
  }

  /** The block in this variation. */
  public BlockDescription describe(BlockType type) {
    return type.describe(values, conditions);
  }

  /**
   * The block in this variation, empty where it cannot be described: {@link DescriptionRule} says
   * so, and other rules have nothing to look at.
   */
  Optional<BlockDescription> attempt(BlockType type) {
    try {
      return Optional.of(describe(type));
    } catch (RuntimeException e) {
      return Optional.empty();
    }
  }
}

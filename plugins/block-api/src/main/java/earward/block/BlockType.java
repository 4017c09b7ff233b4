package earward.block;

import earward.block.check.Finding;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * One kind of block, offered by a plug-in. The jar names its types in {@code
 * META-INF/services/earward.block.BlockType}, carries {@code Block-Api-Version}, {@code Plugin-Id}
 * and {@code Plugin-Version} in its manifest, and the words in {@code texts.properties} beside the
 * class (see {@link BlockTexts}).
 *
 * <p>Implementations have a public constructor without arguments, hold no state and are safe for
 * several threads.
 */
public interface BlockType {

  /** Stable and unique, role and name, for instance {@code detector.envelope-diode}. */
  String id();

  /** What it is for. */
  Role role();

  /** What the designer may set, in the order in which it is shown. */
  List<Setting> settings();

  /**
   * The block for these settings. Runs once per edit; must depend on nothing but its arguments.
   *
   * @throws IllegalArgumentException with one sentence when the settings do not go together
   */
  BlockDescription describe(Values values, Conditions conditions);

  /** How it chooses its own values, where it can. */
  default Optional<Proposer> proposer() {
    return Optional.empty();
  }

  /**
   * A judgement that no check can put as data; runs once per edit, on the nominal design.
   *
   * @param figure gives a solved figure by its local name (see {@code FigureName.parse}), NaN where
   *     there is none
   */
  default List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return List.of();
  }

  /**
   * The class beside which {@link BlockTexts} finds the words: this type's own. A type that wraps
   * another names the class of the one within.
   */
  default Class<?> besideTexts() {
    return getClass();
  }
}

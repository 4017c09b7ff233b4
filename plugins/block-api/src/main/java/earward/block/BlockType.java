package earward.block;

import earward.block.check.Finding;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * One kind of block, offered by a plug-in: an id, a role, settings, and a description of its parts
 * for any values of them. No solving: network, drawing, parts list and figures derive from the
 * description.
 *
 * <p>A plug-in is a jar with
 *
 * <ul>
 *   <li>the class, public, with a public constructor without arguments, holding no state, safe for
 *       several threads, using nothing but the JDK and {@code earward.block};
 *   <li>its name in {@code META-INF/services/earward.block.BlockType};
 *   <li>its words in {@code texts.properties} beside the class (see {@link BlockTexts}), one file
 *       for all blocks of a package;
 *   <li>{@code Block-Api-Version: 1}, {@code Plugin-Id} and {@code Plugin-Version} in its manifest.
 * </ul>
 *
 * <p>A plug-in may hold several blocks: one class and one line of the services file each, and a
 * contract test for each. Each block type id and each {@code Plugin-Id} belongs to one jar. Where a
 * second jar, in the order of their file names, brings one that is there already, its block, or
 * with the same {@code Plugin-Id} the whole jar, is refused with a sentence; the first stays. Take
 * a name of your own after the point, such as {@code filter.reedbank-shelf}: {@code earward blocks}
 * lists the ids that are taken, the program's own among them.
 *
 * <p>The contract test of {@code block-testkit} says what is missing, in sentences.
 */
public interface BlockType {

  /**
   * Stable and unique: a word for the role, a point and a name, in lower case with hyphens, for
   * instance {@code detector.envelope-diode}. Design files and texts refer to it.
   */
  String id();

  /** What it is for, and so where it may stand and which ports it has. */
  Role role();

  /** What the designer may set, in the order in which it is shown. */
  List<Setting> settings();

  /**
   * The block for these settings. Runs once per edit; must depend on nothing but its arguments.
   *
   * @param values a value for each of {@link #settings()}, within its limits
   * @param conditions what the kit must do, for the limits of checks
   * @return parts, checks and curves; the same for the same arguments
   * @throws IllegalArgumentException with one sentence when the settings do not go together
   */
  BlockDescription describe(Values values, Conditions conditions);

  /**
   * How it chooses its own values, where it can. Wanted where a designer might turn the value
   * later: a proposal becomes settings, shown and edited like any. What is never turned by hand and
   * follows from the settings alone is worked out in {@link #describe}: it moves with every edit
   * and cannot be set.
   */
  default Optional<Proposer> proposer() {
    return Optional.empty();
  }

  /**
   * What it can do for a seam where two blocks do not suit one another. The host puts it there with
   * values of its own choice, solves, and shows what comes of it. A block that is no help there
   * says nothing.
   */
  default List<SeamUse> seamUses() {
    return List.of();
  }

  /**
   * A judgement that no check can put as data; runs once per edit, on the nominal design. Prefer
   * {@link earward.block.check.Check}: only checks are held against every kit of a batch, and only
   * they have remedies. What it says are texts of the block, by {@code Finding.inWords}.
   *
   * @param values as in {@link #describe}
   * @param conditions as in {@link #describe}
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

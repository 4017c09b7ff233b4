package earward.block;

import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.Map;

/**
 * Chooses values for a block by its design equations, when a designer asks for it and not at every
 * edit (see {@link BlockType#proposer}). What it proposes is solved and reviewed before it is
 * offered.
 */
@FunctionalInterface
public interface Proposer {

  /**
   * Values that should suit.
   *
   * @param setting what is asked
   * @return new values by setting id; settings that are not named stay as they are
   */
  Map<String, SettingValue> propose(Setting setting);

  /**
   * What a proposer may know.
   *
   * @param values the settings as they stand
   * @param conditions what the kit must do
   * @param sourceOhms impedance of what stands before the block, at the test tone
   * @param loadOhms impedance of what stands after it, at the test tone
   */
  record Setting(Values values, Conditions conditions, double sourceOhms, double loadOhms) {}
}

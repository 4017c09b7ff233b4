package earward.block.testkit;

import earward.block.BlockType;
import earward.block.Proposer;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.List;
import java.util.Map;

/**
 * What the block proposes are settings of its own within their limits, and its judgement bears any
 * figures, missing ones included.
 */
public final class ProposerRule implements BlockRule {
  private static final List<Double> OHMS = List.of(1.0, 1e3, 1e6);

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      type.proposer().ifPresent(proposer -> proposals(type, proposer, variation, faults));
      judgement(type, variation, faults);
    }
    return faults.all();
  }

  private static void proposals(
      BlockType type, Proposer proposer, Variation variation, Faults faults) {
    for (double source : OHMS) {
      for (double load : OHMS) {
        Proposer.Setting asked =
            new Proposer.Setting(variation.values(), variation.conditions(), source, load);
        Map<String, SettingValue> proposed = proposer.propose(asked);
        faults.addIf(
            !proposed.equals(proposer.propose(asked)),
            "two proposals for the same settings differ");
        Values after = variation.values();
        for (Map.Entry<String, SettingValue> one : proposed.entrySet()) {
          within(type, one.getKey(), one.getValue(), faults);
          after = after.with(one.getKey(), one.getValue());
        }
        new Variation("proposed", after, variation.conditions()).describe(type);
      }
    }
  }

  private static void within(BlockType type, String id, SettingValue value, Faults faults) {
    for (Setting setting : type.settings()) {
      if (setting.id().equals(id)) {
        faults.addIf(!fits(setting, value), "setting '" + id + "' cannot be " + value);
        return;
      }
    }
    faults.add("it proposes '" + id + "', no setting of the block");
  }

  private static boolean fits(Setting setting, SettingValue value) {
    if (setting instanceof Setting.Value limits && value instanceof SettingValue.Amount amount) {
      return limits.least() <= amount.number() && amount.number() <= limits.most();
    } else if (setting instanceof Setting.Choice choice
        && value instanceof SettingValue.Option option) {
      return choice.options().contains(option.word());
    } else if (setting instanceof Setting.Part part
        && value instanceof SettingValue.Chosen chosen) {
      return chosen.model().kind() == part.kind();
    }
    return false;
  }

  private static void judgement(BlockType type, Variation variation, Faults faults) {
    for (double figure : List.of(Double.NaN, 0.0, 1.0, -1.0, 1e9)) {
      try {
        type.judge(variation.values(), variation.conditions(), name -> figure)
            .forEach(
                finding ->
                    faults.addIf(
                        !finding.code().matches("[a-z0-9]+(-[a-z0-9]+)*"),
                        "'" + finding.code() + "' is no code of a finding"));
      } catch (RuntimeException e) {
        faults.add("its judgement fails where every figure is " + figure + ": " + e);
      }
    }
  }
}

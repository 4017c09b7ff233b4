package earward.block.testkit;

import earward.block.BlockType;
import earward.block.Proposer;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.List;
import java.util.Map;

/** What the block proposes are settings of its own within their limits, the same each time. */
public final class ProposerRule implements BlockRule {
  private static final List<Double> OHMS = List.of(1.0, 1e3, 1e6);

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      type.proposer().ifPresent(proposer -> proposals(type, proposer, variation, faults));
    }
    return faults.all();
  }

  private static void proposals(
      BlockType type, Proposer proposer, Variation variation, Faults faults) {
    for (double source : OHMS) {
      for (double load : OHMS) {
        Proposer.Setting asked =
            new Proposer.Setting(variation.values(), variation.conditions(), source, load);
        try {
          proposal(type, proposer, asked, variation, faults);
        } catch (RuntimeException e) {
          faults.addIn(
              variation,
              "fails " + e.getClass() + Shown.place(type, e),
              "its proposer, or a description of what it proposed, fails with "
                  + (Shown.settings(type, variation.values()) + ", a source of ")
                  + (Shown.quantity(source, Unit.OHM) + " and a load of ")
                  + (Shown.quantity(load, Unit.OHM) + ": " + Shown.thrown(type, e)));
        }
      }
    }
  }

  private static void proposal(
      BlockType type,
      Proposer proposer,
      Proposer.Setting asked,
      Variation variation,
      Faults faults) {
    Map<String, SettingValue> proposed = proposer.propose(asked);
    faults.addIf(
        !proposed.equals(proposer.propose(asked)),
        "two proposals for the same settings differ; use nothing but what is asked");
    Values after = asked.values();
    for (Map.Entry<String, SettingValue> one : proposed.entrySet()) {
      within(type, one.getKey(), one.getValue(), variation, faults);
      after = after.with(one.getKey(), one.getValue());
    }
    type.describe(after, asked.conditions());
  }

  private static void within(
      BlockType type, String id, SettingValue value, Variation variation, Faults faults) {
    for (Setting setting : type.settings()) {
      if (setting.id().equals(id)) {
        if (!fits(setting, value)) {
          faults.addIn(
              variation,
              "beyond " + id,
              "it proposes "
                  + (Shown.value(setting, value) + " for setting '" + id + "', which takes ")
                  + Shown.limits(setting));
        }
        return;
      }
    }
    faults.add("it proposes a value for '" + id + "', which is no setting of the block");
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
}

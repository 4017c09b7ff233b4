package earward.block.testkit;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Resistor;
import earward.block.figure.FigureName;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A sound RC section. Each test spoils one thing in a subclass and sees its rule go red. */
public class SampleBlock implements BlockType {
  @Override
  public String id() {
    return "filter.sample";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Value("r1", Unit.OHM, 1e3, 10, 1e6, Series.E12),
        new Setting.Choice("size", List.of("small", "large")));
  }

  protected Wiring wiring(Values values) {
    return Wiring.from(new Single("in"))
        .run("r1", new Resistor(values.amount("r1")), "out")
        .down("c1", Capacitor.of(values.chosen("size", "small") ? 1e-9 : 10e-9, 63), GROUND)
        .testPoint("out", "out")
        .to(new Single("out"));
  }

  protected Check check() {
    return check("out:high-edge-hertz@test", 4.5e3, RemedyHint.lower("r1"));
  }

  protected static Check check(String figure, double limit, RemedyHint... remedies) {
    return Check.atLeast(
        "treble", Severity.NOTE, FigureName.parse(figure), limit, "the test's own", remedies);
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return BlockDescription.of(wiring(values), check());
  }

  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(asked -> Map.of("r1", new SettingValue.Amount(4.7e3)));
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return figure.applyAsDouble("out:dc-volts@test") > 5
        ? List.of(Finding.of(Severity.NOTE, "much", "", "There is much."))
        : List.of();
  }

  @Override
  public Class<?> besideTexts() {
    return SampleBlock.class;
  }
}

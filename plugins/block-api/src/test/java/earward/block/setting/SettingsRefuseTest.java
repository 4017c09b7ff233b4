package earward.block.setting;

import static earward.block.Refused.refused;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.LoudspeakerModel;
import earward.block.device.PartKind;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.SettingValue.Amount;
import earward.block.setting.SettingValue.Chosen;
import earward.block.setting.SettingValue.Option;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

class SettingsRefuseTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;
  private static final FigureName READING =
      new FigureName("out", Quantity.DC_VOLTS, CaseName.NO_SIGNAL);

  private static Setting value(String id, double usual, double least, double most) {
    return new Setting.Value(id, Unit.OHM, usual, least, most, Series.E12);
  }

  @TestFactory
  Stream<DynamicTest> settingsThatMakeNoSense() {
    return Stream.of(
        refused("a name with a blank", () -> value("r 1", 1, 0, 2), "'r 1'", "hyphens"),
        refused("usual below least", () -> value("r1", 1, 2, 3), "'r1'", "1.0", "2.0 to 3.0"),
        refused("usual above most", () -> value("r1", 4, 2, 3), "'r1'", "4.0"),
        refused("usual no number", () -> value("r1", Double.NaN, 2, 3), "'r1'", "NaN"),
        refused("usual without bound", () -> value("r1", INFINITE, 2, INFINITE), "'r1'"),
        refused("no options", () -> new Setting.Choice("load", List.of()), "'load'", "no options"),
        refused(
            "an option twice",
            () -> new Setting.Choice("load", List.of("none", "none")),
            "'load'",
            "twice"),
        refused(
            "no usual part", () -> new Setting.Part("d1", PartKind.DIODE, " "), "'d1'", "library"),
        refused("a knob beyond", () -> new Setting.Position("knob", 1.2, "track"), "'knob'", "1.2"),
        refused("a knob on nothing", () -> new Setting.Position("knob", 0.5, ""), "''"),
        refused(
            "a target that is no number",
            () -> new Setting.Trim("bias", "trimmer", READING, Double.NaN),
            "'bias'",
            "NaN"),
        refused("an amount that is no number", () -> new Amount(Double.NaN), "a number"));
  }

  @TestFactory
  Stream<DynamicTest> valuesAskedForAmiss() {
    Values values =
        Values.of(
            Map.of(
                "r1", new Amount(47),
                "load", new Option("none"),
                "diode",
                    new Chosen(DiodeModel.plain("BAT46", DiodeMaterial.SCHOTTKY, 1e-7, 1, 5))));
    return Stream.of(
        refused("no such setting", () -> values.amount("r2"), "'r2'", "r1"),
        refused("a word for a number", () -> values.amount("load"), "'load'", "of that kind"),
        refused("a number for a word", () -> values.choice("r1"), "'r1'", "of that kind"),
        refused(
            "a diode for a loudspeaker",
            () -> values.part("diode", LoudspeakerModel.class),
            "'diode'",
            "BAT46"));
  }

  @Test
  void changingAValueLeavesTheFormerValuesAlone() {
    Values before = Values.of(Map.of("r1", new Amount(47)));
    Values after = before.with("r1", new Amount(100));

    assertThat(before.amount("r1")).isEqualTo(47);
    assertThat(after.amount("r1")).isEqualTo(100);
    assertThat(after).isNotEqualTo(before).isEqualTo(Values.of(Map.of("r1", new Amount(100))));
  }
}

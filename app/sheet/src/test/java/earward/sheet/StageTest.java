package earward.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.Role;
import earward.block.figure.Quantity;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewedKit;
import earward.kit.stage.BuildStages;
import earward.kit.stage.SolvedStage;
import earward.sheet.content.Building;
import earward.sheet.content.ShoppingRow;
import earward.sheet.content.StageRow;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The build stages of the starter kits: what is fitted when, and what it reads then. */
class StageTest {
  private static Assembly assembly(String name) throws Exception {
    return StarterKits.assembled(StarterKits.design(name));
  }

  private static double volts(SolvedStage stage, String place, boolean injected) {
    return stage
        .figures()
        .find(place, Quantity.DC_VOLTS, injected ? SolvedStage.INJECTED : SolvedStage.AT_REST)
        .orElseThrow();
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void everyBlockIsFittedOnceFromTheLoudspeakerBack(String name) throws Exception {
    Assembly kit = assembly(name);
    List<SolvedStage> stages = BuildStages.solve(kit);
    List<String> fitted = new ArrayList<>();
    stages.forEach(stage -> stage.stage().blocks().forEach(block -> fitted.add(block.id())));
    assertThat(fitted)
        .containsExactlyInAnyOrderElementsOf(kit.blocks().stream().map(b -> b.id()).toList());
    assertThat(stages.get(0).stage().path().get(0).type().role()).isEqualTo(Role.POWER);
    assertThat(stages.get(0).stage().beside()).anyMatch(b -> b.type().role() == Role.SUPPLY);
    SolvedStage last = stages.get(stages.size() - 1);
    assertThat(last.joints()).isEmpty();
    assertThat(last.partial().path()).isEqualTo(kit.path());
  }

  @Test
  void aTrackReadsWhatTheDividerOfTestResistorAndTrackGives() throws Exception {
    // Ohm's law, but for the leakage of capacitors: 1.5 V through 10 kΩ into the track of 22 kΩ,
    // then with R1 of 1 kΩ before it
    List<SolvedStage> stages = BuildStages.solve(assembly("lantern"));
    assertThat(volts(stages.get(1), "volume.top", true)).isCloseTo(1.5 * 22 / 32, within(2e-3));
    assertThat(volts(stages.get(1), "volume.wiper", true)).isCloseTo(1.5 * 22 / 32, within(2e-3));
    assertThat(volts(stages.get(2), "filter.out", true)).isCloseTo(1.5 * 22 / 33, within(2e-3));
    assertThat(volts(stages.get(1), "volume.top", false)).isCloseTo(0, within(1e-4));
  }

  @Test
  void aDetectorDiodeTakesItsDropFromTheCell() throws Exception {
    // a Schottky diode of small signals drops 0.1 V to 0.4 V at tens of µA (data sheets of BAT46,
    // from memory); R1 and track follow it, the AGC line loads it beside them
    SolvedStage stage = BuildStages.solve(assembly("lantern")).get(3);
    double out = volts(stage, "detector.out", true);
    double track = volts(stage, "volume.top", true);
    assertThat(track).isCloseTo(out * 22 / 23, within(1e-3));
    double load = 1 / (1 / 23e3 + 1 / 80e3);
    double drop = 1.5 - out - 10e3 * out / load;
    assertThat(drop).isBetween(0.08, 0.4);
  }

  @Test
  void theDiodeOfANegativeDetectorIsTriedWithTheCellReversed() throws Exception {
    var design = StarterKits.design("lantern").withSetting("detector", "direction", "negative");
    List<SolvedStage> stages = BuildStages.solve(StarterKits.assembled(design));
    assertThat(stages.get(3).injectedVolts()).isEqualTo(-1.5);
    assertThat(volts(stages.get(3), "detector.out", true)).isLessThan(-0.5);
    assertThat(stages.get(2).injectedVolts()).isEqualTo(1.5);
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void theFirstSwitchOnLeavesTheKitMostOfItsSupply(String name) throws Exception {
    Assembly kit = assembly(name);
    SolvedStage first = BuildStages.solve(kit).get(0);
    String source = name.equals("boathouse") ? "adaptor.adaptor" : "battery.battery";
    String rail = name.equals("boathouse") ? "adaptor.rail" : "battery.rail";
    double amperes =
        first
            .figures()
            .find(source, Quantity.SUPPLY_AMPERES, SolvedStage.FIRST_POWER)
            .orElseThrow();
    double railThen =
        first.figures().find(rail, Quantity.DC_VOLTS, SolvedStage.FIRST_POWER).orElseThrow();
    // Kirchhoff: what is missing on the rail stands across the resistor, but for the lead's parts
    double missing = volts(first, rail, false) - railThen;
    assertThat(missing).isCloseTo(amperes * first.seriesOhms(), within(0.02));
    assertThat(missing / railThen).isBetween(0.03, 0.2);
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void theWholeStagedKitRestsAsTheSolvedKitDoes(String name) throws Exception {
    ReviewedKit kit = StarterKits.reviewed(StarterKits.design(name));
    List<SolvedStage> stages = BuildStages.solve(kit.solved().assembly());
    SolvedStage last = stages.get(stages.size() - 1);
    Figures whole = kit.figures();
    kit.solved()
        .assembly()
        .testPoints()
        .forEach(
            point -> {
              if (!point.place().startsWith("power.control")) { // the knob stands elsewhere
                double there =
                    whole
                        .find(
                            point.place(),
                            Quantity.DC_VOLTS,
                            earward.block.figure.CaseName.NO_SIGNAL)
                        .orElseThrow();
                assertThat(volts(last, point.place(), false))
                    .as(point.place())
                    .isCloseTo(there, within(5e-3 + 0.01 * Math.abs(there)));
              }
            });
    Building building = Sheets.of(kit, stages).building();
    Set<String> parts = new HashSet<>();
    for (StageRow stage : building.stages()) {
      stage.parts().forEach(part -> assertThat(parts.add(part.reference())).isTrue());
    }
    assertThat(parts)
        .containsExactlyInAnyOrderElementsOf(
            Sheets.of(kit).parts().stream().map(part -> part.reference()).toList());
    try (ReadSheet sheet = ReadSheet.of(Sheets.of(kit, stages))) {
      assertThat(sheet.text()).contains("Stage 1: ", "First sound", "Last check", "Shopping list");
    }
  }

  @Test
  void theShoppingListIsForAsManyKitsAsAreBuilt() throws Exception {
    Assembly kit = assembly("lantern");
    ReviewedKit reviewed =
        new ReviewedKit(new SolvedKit(kit, Figures.NONE, List.of(), false), List.of());
    Building one = Sheets.of(reviewed).building();
    int parts = one.shopping().stream().mapToInt(ShoppingRow::perKit).sum();
    assertThat(parts).isEqualTo(Sheets.of(reviewed).parts().size());
    ShoppingRow twin =
        one.shopping().stream()
            .filter(row -> row.references().equals(List.of("R2", "R3")))
            .findFirst()
            .orElseThrow();
    // common practice: one in twenty more of what is small
    assertThat(twin.forKits(200)).isEqualTo(420);
    assertThat(twin.forKits(1)).isEqualTo(2);
    String csv = ShoppingCsv.of(one.forKits(200));
    assertThat(csv).startsWith("part,rating,references,per kit,for 200 kits\r\n");
    assertThat(csv).contains("Resistor 4.7 Ω,\"0.25 W, ±5 %\",R2 R3,2,420\r\n");
  }

  @Test
  void aKitWithoutFiguresHasNoStages() throws Exception {
    var broken = StarterKits.design("lantern").withoutBlock("battery");
    assertThat(BuildStages.solve(StarterKits.assembled(broken))).isEmpty();
  }
}

package earward.block.testkit;

import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.CATHODE;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockDescription;
import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.TransistorModel;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What an author reads: each fault once, with what was tried, and the figures of a plain kit. */
class WhatIsSaidTest {

  /** An emitter follower whose base is held by a divider with a diode in it. */
  private static final class Follower extends SampleBlock {
    private final boolean turned;

    Follower(boolean turned) {
      this.turned = turned;
    }

    @Override
    protected Wiring wiring(Values values) {
      Diode diode = new Diode((DiodeModel) SampleParts.of(PartKind.DIODE).get(0));
      BipolarTransistor npn =
          new BipolarTransistor((TransistorModel) SampleParts.of(PartKind.TRANSISTOR).get(0));
      return Wiring.from(new Single("in"))
          .run("couple", Capacitor.of(1e-7, 63), "base")
          .up("r2", new Resistor(100e3), MAIN_RAIL)
          .run("d1", diode, turned ? CATHODE : ANODE, "held")
          .down("r3", new Resistor(47e3), GROUND)
          .body("t1", npn, Map.of(COLLECTOR, MAIN_RAIL, BASE, "base", EMITTER, "out"))
          .at("out")
          .down("r4", new Resistor(1e3), GROUND)
          .testPoint("out", "out")
          .to(new Single("out"));
    }

    @Override
    protected Check check() {
      return SampleBlock.check("out:dc-volts@no-signal", turned ? 8 : 1);
    }
  }

  private static List<String> said(SampleBlock block) {
    List<String> lines = new ArrayList<>();
    assertThat(new WholeKitRule(lines::add).faults(block, Variations.of(block))).isEmpty();
    return lines;
  }

  @Test
  void aDiodeTheWrongWayRoundIsSaidThoughAllIsGreen() {
    assertThat(said(new Follower(true)))
        .anyMatch(line -> line.contains("diode 'd1'") && line.contains("REVERSED"));
    assertThat(said(new Follower(false)))
        .anyMatch(line -> line.contains("diode 'd1'"))
        .anyMatch(line -> line.contains("transistor 't1'") && line.contains("mA"))
        .noneMatch(line -> line.contains("REVERSED") || line.contains("NOTHING"));
  }

  @Test
  void eachCheckIsSaidWithFigureLimitAndVerdict() {
    assertThat(said(new Follower(false)))
        .anyMatch(line -> line.contains("treble (NOTE): out:dc-volts@no-signal is"))
        .anyMatch(line -> line.contains("wanted at least 1 V: holds"));
    assertThat(said(new Follower(true)))
        .anyMatch(line -> line.contains("wanted at least 8 V: DOES NOT HOLD"));
  }

  private static List<String> faults(BlockRule rule, SampleBlock block) {
    return rule.faults(block, Variations.of(block));
  }

  private static SampleBlock checked(String figure) {
    return new SampleBlock() {
      @Override
      protected Check check() {
        return SampleBlock.check(figure, 1);
      }
    };
  }

  @Test
  void aFigureThatAnotherCaseHasIsSaidWithThatCase() {
    assertThat(faults(new WholeKitRule(), checked("out:distortion@no-signal")))
        .singleElement()
        .asString()
        .contains("out:distortion@no-signal; there is one in the cases [weak, test", "1 other");
    assertThat(faults(new WholeKitRule(), checked("r1:peak-amperes@test")))
        .singleElement()
        .asString()
        .contains("an AudioAmplifier; this variation has none");
  }

  @Test
  void aFaultOfAllVariationsIsSaidOnceWithTheSettingsOfTheFirst() {
    SampleBlock failing =
        new SampleBlock() {
          @Override
          public BlockDescription describe(Values values, Conditions conditions) {
            throw new IllegalArgumentException("found " + values.amount("r1"));
          }
        };

    assertThat(faults(new DescriptionRule(), failing))
        .filteredOn(f -> f.contains("cannot be described"))
        .singleElement()
        .asString()
        .contains("r1 1 kΩ, size 'small': IllegalArgumentException: found 1000.0 in WhatIsSaid")
        .contains("(with usual values, size small, and in 5 others)");
  }

  @Test
  void aCautionThatDependsOnThePartSaysOnWhat() {
    SampleBlock germanium =
        new SampleBlock() {
          @Override
          public List<Setting> settings() {
            List<Setting> settings = new ArrayList<>(super.settings());
            settings.add(new Setting.Part("diode", PartKind.DIODE, "AA119"));
            return settings;
          }

          @Override
          protected Wiring wiring(Values values) {
            return Wiring.from(new Single("in"))
                .run("d1", new Diode(values.part("diode", DiodeModel.class)), "out")
                .testPoint("out", "out")
                .to(new Single("out"));
          }
        };

    assertThat(faults(new WiringRule(), germanium))
        .singleElement()
        .asString()
        .contains("Caution.GERMANIUM_HEAT), only when diode.model().material()")
        .contains("diode sample germanium diode");
  }

  @Test
  void aUsualPartThatTheLibraryDoesNotHaveIsFound() {
    SampleBlock misnamed =
        new SampleBlock() {
          @Override
          public List<Setting> settings() {
            return List.of(
                new Setting.Part("npn", PartKind.TRANSISTOR, "BC547B"),
                new Setting.Part("pnp", PartKind.TRANSISTOR, "BC 557"));
          }
        };

    assertThat(faults(new DescriptionRule(), misnamed))
        .filteredOn(fault -> fault.contains("parts library"))
        .singleElement()
        .asString()
        .contains("'pnp'", "'BC 557'", "BC557B");
    for (PartKind kind : PartKind.values()) {
      assertThat(LibraryNames.of(kind)).as(kind.key()).isNotEmpty();
    }
  }
}

package earward.block.testkit;

import static earward.block.wiring.Nodes.GROUND;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Curve;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.Capacitor;
import earward.block.device.PartKind;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.FigureName;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RulesGoRedTest {

  private static List<String> faults(BlockRule rule, BlockType type) {
    return rule.faults(type, Variations.of(type));
  }

  private static SampleBlock wired(Function<Values, Wiring> wiring) {
    return new SampleBlock() {
      @Override
      protected Wiring wiring(Values values) {
        return wiring.apply(values);
      }
    };
  }

  private static SampleBlock checked(Check check) {
    return new SampleBlock() {
      @Override
      protected Check check() {
        return check;
      }
    };
  }

  private static List<String> faultsOfWiring(Wiring wiring) {
    return faults(new WiringRule(), wired(values -> wiring));
  }

  @Test
  void aNodeWithOneEndIsFound() {
    Wiring loose =
        Wiring.from(new Single("in"))
            .run("r1", new Resistor(1e3), "out")
            .down("c1", Capacitor.of(1e-9, 63), "gruond")
            .testPoint("out", "out")
            .to(new Single("out"));

    assertThat(faultsOfWiring(loose)).singleElement().asString().contains("'gruond'", "one end");
  }

  @Test
  void aPartThatStandsAtOneNodeIsFound() {
    Wiring shorted =
        Wiring.from(new Single("in"))
            .run("r1", new Resistor(1e3), "in")
            .testPoint("in", "in")
            .to(new Single("in"));

    assertThat(faultsOfWiring(shorted)).singleElement().asString().contains("'r1'", "one node");
  }

  @Test
  void portsMustSuitTheRole() {
    Wiring noExit = Wiring.from(new Single("in")).down("r1", new Resistor(1), GROUND).end();
    Wiring noEntry = Wiring.start().at("out").down("r1", new Resistor(1), GROUND).end();

    assertThat(faultsOfWiring(noExit)).anyMatch(f -> f.contains("end with to("));
    assertThat(faultsOfWiring(noEntry)).anyMatch(f -> f.contains("begin with Wiring.from("));
    assertThat(faultsOfWiring(noExit)).anyMatch(f -> f.contains("no test point"));
  }

  @Test
  void aSupplyOffersARailAndNobodyElseDoes() {
    Wiring offering =
        Wiring.from(new Single("in"))
            .run("r1", new Resistor(1), "out")
            .up("r2", new Resistor(1), Nodes.MAIN_RAIL)
            .offerRail("main", Nodes.MAIN_RAIL)
            .testPoint("out", "out")
            .to(new Single("out"));
    SampleBlock supply =
        new SampleBlock() {
          @Override
          public Role role() {
            return Role.SUPPLY;
          }
        };

    assertThat(faultsOfWiring(offering)).singleElement().asString().contains("offers no rails");
    assertThat(faults(new WiringRule(), supply))
        .anyMatch(f -> f.contains("offerRail"))
        .anyMatch(f -> f.contains("Wiring.start()"))
        .anyMatch(f -> f.contains("end with end()"));
  }

  @Test
  void partsThatCanDoHarmMustCarryTheirCaution() {
    BatteryModel cells = (BatteryModel) SampleParts.of(PartKind.BATTERY).get(0);
    Wiring bare =
        Wiring.from(new Single("in"))
            .run("c1", Capacitor.of(10e-6, 25), "out")
            .down("b1", new Battery(cells), GROUND)
            .testPoint("out", "out")
            .to(new Single("out"));

    assertThat(faultsOfWiring(bare))
        .anyMatch(f -> f.contains("'c1'") && f.contains("Caution.POLARITY"))
        .anyMatch(f -> f.contains("'b1'") && f.contains("Caution.BATTERY_SHORT"));
  }

  @Test
  void aTestPointMayNotBearTheNameOfAnotherNode() {
    Wiring misnamed =
        Wiring.from(new Single("in"))
            .run("r1", new Resistor(1), "out")
            .testPoint("in", "out")
            .to(new Single("out"));

    assertThat(faultsOfWiring(misnamed)).singleElement().asString().contains("another node");
  }

  @ParameterizedTest
  @CsvSource({
    "out:junction-celsius@test, wanted a part that is an AudioAmplifier",
    "far:dc-volts@test, wanted a node or test point",
    "r1:dc-volts@test, wanted a node or test point",
    "out:high-edge-hertz@sometimes, in the case 'sometimes'",
    "out:onward-ohms@test, write the empty place",
    "out:output-watts@test, of the whole path",
    "c1:clipping-depth@deepest, is a Diode"
  })
  void aCheckOfAFigureThatIsNotThereIsFound(String figure, String words) {
    assertThat(faults(new CheckRule(), checked(SampleBlock.check(figure, 1))))
        .singleElement()
        .asString()
        .startsWith("check treble: the block has no ")
        .contains(words);
  }

  @Test
  void figuresThatAreThereAreNot() {
    for (String figure :
        List.of(
            "in:dc-volts@no-signal",
            "out:distortion@test",
            "r1:dissipation-watts@hottest",
            ":onward-ohms@test",
            "out:dc-volts@stage-2")) {
      assertThat(faults(new CheckRule(), checked(SampleBlock.check(figure, 1)))).isEmpty();
    }
  }

  @Test
  void remediesMustTurnWhatTheBlockHas() {
    String figure = "out:high-edge-hertz@test";

    assertThat(
            faults(new CheckRule(), checked(SampleBlock.check(figure, 1, RemedyHint.lower("r2")))))
        .singleElement()
        .asString()
        .contains("'r2'", "[r1, size]");
    assertThat(
            faults(
                new CheckRule(), checked(SampleBlock.check(figure, 1, RemedyHint.lower("size")))))
        .singleElement()
        .asString()
        .contains("'size'", "a choice or a part is changed");
  }

  @Test
  void aLimitOfNothingAndACurveBeyondItsSettingAreFound() {
    SampleBlock block =
        new SampleBlock() {
          @Override
          public BlockDescription describe(Values values, Conditions conditions) {
            FigureName figure = FigureName.parse("out:high-edge-hertz@test");
            return new BlockDescription(
                wiring(values),
                List.of(SampleBlock.check(figure.toString(), Double.POSITIVE_INFINITY)),
                List.of(
                    new Curve("wide", "r1", 1, 2e6, 11, List.of(figure)),
                    new Curve("worded", "size", 0, 1, 11, List.of(figure))));
          }
        };

    assertThat(faults(new CheckRule(), block))
        .hasSize(3)
        .anyMatch(f -> f.contains("infinite limit"))
        .anyMatch(f -> f.contains("curve wide") && f.contains("10 Ω to 1 MΩ"))
        .anyMatch(f -> f.contains("curve worded") && f.contains("a value or a position"));
  }

  @Test
  void wordsThatAreMissingOrLeftOverAreFound() {
    SampleBlock wordy =
        new SampleBlock() {
          @Override
          public String id() {
            return "filter.wordy";
          }
        };

    assertThat(faults(new TextRule(), wordy))
        .anyMatch(f -> f.contains("lacks the line filter.wordy.help"))
        .anyMatch(f -> f.contains("lacks the line filter.wordy.part.c1"))
        .anyMatch(f -> f.contains("check.treble") && f.contains("full stop"))
        .anyMatch(f -> f.contains("check.treble") && f.contains("lacks {limit}"))
        .anyMatch(f -> f.contains("check.treble") && f.contains("{figur}"))
        .anyMatch(f -> f.contains("check.bass") && f.contains("no use"));
  }

  @Test
  void aBlockThatCannotBeDescribedOrDiffersEachTimeIsFound() {
    SampleBlock failing =
        wired(
            values -> {
              throw new IllegalStateException("out of ideas");
            });
    AtomicInteger calls = new AtomicInteger();
    SampleBlock moody =
        new SampleBlock() {
          @Override
          protected Check check() {
            return SampleBlock.check("out:high-edge-hertz@test", calls.incrementAndGet());
          }
        };

    assertThat(faults(new DescriptionRule(), failing)).anyMatch(f -> f.contains("out of ideas"));
    assertThat(faults(new DescriptionRule(), moody)).anyMatch(f -> f.contains("differ"));
    for (BlockRule rule : List.of(new WiringRule(), new CheckRule(), new JudgementRule())) {
      assertThat(faults(rule, failing)).as("what cannot be looked at").isEmpty();
    }
  }

  @Test
  void idAndSettingsAreLookedAt() {
    SampleBlock misnamed =
        new SampleBlock() {
          @Override
          public String id() {
            return "Filter";
          }

          @Override
          public List<Setting> settings() {
            List<Setting> settings = new ArrayList<>(super.settings());
            settings.add(new Setting.Value("R1", Unit.OHM, 1, 1, 1, Series.ANY));
            settings.add(new Setting.Value("r1", Unit.OHM, 1, 1, 1, Series.ANY));
            settings.add(new Setting.Position("knob", 0.5, "track"));
            return settings;
          }
        };

    assertThat(faults(new DescriptionRule(), misnamed))
        .anyMatch(f -> f.contains("'Filter' is no block type id"))
        .anyMatch(f -> f.contains("'R1' is not in lower case"))
        .anyMatch(f -> f.contains("two settings are named 'r1'"))
        .anyMatch(f -> f.contains("turns 'track'"))
        .anyMatch(f -> f.contains("public constructor"));
  }

  private static SampleBlock proposing(Proposer proposer) {
    return new SampleBlock() {
      @Override
      public Optional<Proposer> proposer() {
        return Optional.of(proposer);
      }
    };
  }

  @Test
  void proposalsBeyondTheLimitsAreFound() {
    BlockRule rule = new ProposerRule();

    assertThat(faults(rule, proposing(asked -> Map.of("r1", new SettingValue.Amount(1)))))
        .singleElement()
        .asString()
        .contains("'r1'", "1 Ω", "from 10 Ω to 1 MΩ");
    assertThat(faults(rule, proposing(asked -> Map.of("r9", new SettingValue.Amount(1)))))
        .anyMatch(f -> f.contains("'r9'") && f.contains("no setting"));
    assertThat(faults(rule, proposing(asked -> Map.of("size", new SettingValue.Option("huge")))))
        .anyMatch(f -> f.contains("huge"));
    assertThat(
            faults(
                rule,
                proposing(
                    asked -> {
                      throw new ArithmeticException("divided by nothing");
                    })))
        .anyMatch(f -> f.contains("divided by nothing"));
  }

  private static SampleBlock judging(Function<ToDoubleFunction<String>, List<Finding>> judge) {
    return new SampleBlock() {
      @Override
      public List<Finding> judge(
          Values values, Conditions conditions, ToDoubleFunction<String> figure) {
        return judge.apply(figure);
      }
    };
  }

  @Test
  void judgementsOnWhatIsNotThereAreFound() {
    BlockRule rule = new JudgementRule();

    assertThat(faults(rule, judging(f -> nothing(f.applyAsDouble("d1:clipping-depth@deepest")))))
        .singleElement()
        .asString()
        .contains("d1:clipping-depth@deepest", "is a Diode");
    assertThat(faults(rule, judging(f -> nothing(f.applyAsDouble("out")))))
        .singleElement()
        .asString()
        .contains("place:quantity@case");
    assertThat(
            faults(
                rule,
                judging(
                    f -> {
                      throw new IllegalStateException("not a number");
                    })))
        .anyMatch(f -> f.contains("not a number"));
    assertThat(
            faults(
                rule,
                judging(f -> List.of(Finding.of(Severity.NOTE, "Much Ado", "", "About it.")))))
        .singleElement()
        .asString()
        .contains("'Much Ado'");
  }

  private static List<Finding> nothing(double figure) {
    return Double.isInfinite(figure)
        ? List.of(Finding.of(Severity.NOTE, "endless", "", "It has no end."))
        : List.of();
  }

  @Test
  void refusalsMustRefuseWithASentence() {
    SampleBlock mute =
        wired(
            values -> {
              throw new IllegalArgumentException("");
            });
    SampleBlock rash =
        wired(
            values -> {
              throw new IllegalStateException("no");
            });
    SampleBlock polite =
        wired(
            values -> {
              throw new IllegalArgumentException("an npn cannot stand in the pnp's place");
            });

    assertThat(faults(new RefusalRule(), new SampleBlock())).isNotEmpty();
    assertThat(faults(new RefusalRule(), mute)).anyMatch(f -> f.contains("without a word"));
    assertThat(faults(new RefusalRule(), rash)).anyMatch(f -> f.contains("throw Illegal"));
    assertThat(faults(new RefusalRule(), polite)).isEmpty();
  }

  @Test
  void allChoicesAndSamplePartsAreTriedWithLeastUsualAndMostValues() {
    List<Variation> all = Variations.of(new SampleBlock());

    assertThat(all).hasSize(2 * 3);
    assertThat(all).extracting(v -> v.values().amount("r1")).contains(1e3, 10.0, 1e6);
    assertThat(all).extracting(v -> v.values().choice("size")).contains("small", "large");
    for (PartKind kind : PartKind.values()) {
      assertThat(SampleParts.of(kind)).isNotEmpty().allMatch(part -> part.kind() == kind);
    }
  }

  @Test
  void anElectrolyticTheWrongWayRoundIsFoundInTheSolvedCircuit() {
    SampleBlock reversed =
        wired(
            values ->
                Wiring.from(new Single("in"))
                    .run("couple", Capacitor.of(1e-7, 63), "out")
                    .up("r1", new Resistor(10e3), Nodes.MAIN_RAIL)
                    .down("r2", new Resistor(10e3), GROUND)
                    .down("c1", Capacitor.of(10e-6, 25), Terminal.B, GROUND)
                    .testPoint("out", "out")
                    .to(new Single("out")));

    assertThat(faults(new DirectCurrentRule(), reversed))
        .isNotEmpty()
        .allMatch(f -> f.contains("'c1'") && f.contains("terminal A at the more positive"));
  }

  @Test
  void aBlockThatDoesNotFitIntoAKitIsFound() {
    SampleBlock plain =
        wired(
            values ->
                Wiring.from(new Single("in"))
                    .run("r1", new Resistor(1e3), "out")
                    .testPoint("out", "out")
                    .to(new Single("out")));
    SampleBlock asLoad =
        new SampleBlock() {
          @Override
          public Role role() {
            return Role.LOAD;
          }
        };

    assertThat(faults(new DirectCurrentRule(), plain)).isEmpty();
    assertThat(faults(new DirectCurrentRule(), asLoad))
        .anyMatch(f -> f.contains("does not fit into a kit"));
    assertThat(faults(new WholeKitRule(), asLoad)).anyMatch(f -> f.contains("is not solved"));
  }

  @Test
  void aCheckThatTheKitCannotHoldIsFound() {
    SampleBlock heated =
        new SampleBlock() {
          @Override
          protected Check check() {
            return SampleBlock.check("r1:junction-celsius@hottest", 1);
          }
        };

    assertThat(faults(new WholeKitRule(), heated))
        .isNotEmpty()
        .allMatch(f -> f.contains("check treble cannot be held"));
  }
}

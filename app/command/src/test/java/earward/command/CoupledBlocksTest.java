package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Slot;
import earward.engine.Solver;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The whole path is one circuit: a part changed by a tenth moves the readings of every block that
 * is coupled to it, and leaves alone the DC of those that a capacitor keeps from it.
 *
 * <p>In the Lantern the wiper's capacitor divides the kit for DC: feed, detector, filter, volume
 * control and AGC on one side; amplifier, loudspeaker and supply on the other.
 */
class CoupledBlocksTest {
  /** What a reading must move by to have moved; solves from another start agree to a few in 1e9. */
  private static final double MOVED = 1e-8;

  /** What counts as not moved at all. */
  private static final double STILL = 5e-9;

  private static final Set<String> DETECTOR_SIDE =
      Set.of("feed", "detector", "filter", "volume", "agc");
  private static final List<String> DETECTOR_DC =
      List.of("detector.out", "filter.out", "volume.wiper", "agc.agc");
  private static final List<String> AMPLIFIER_DC =
      List.of("power.in", "power.plus", "power.minus", "battery.rail");
  private static final List<String> AUDIO =
      List.of(
          "detector.out",
          "filter.out",
          "volume.wiper",
          "power.in",
          "power.plus",
          "loudspeaker.hot");

  private static final CompiledKit KIT =
      KitSolver.compile(TestKits.assembled(TestKits.starter("lantern")));
  private static final Solver SOLVER = KIT.circuit().newSolver();
  private static final Figures NOMINAL = solved(KIT.circuit().nominalValues());

  private static Figures solved(double[] values) {
    double[] row = new double[KIT.circuit().figures().size()];
    assertThat(SOLVER.solve(values, row).solved()).isTrue();
    return KIT.figures(row);
  }

  private static Figures withATenthMore(String slot) {
    double[] values = KIT.circuit().nominalValues();
    values[KIT.circuit().slot(slot)] *= 1.1;
    return solved(values);
  }

  private static double moved(Figures figures, String place, Quantity quantity, CaseName name) {
    FigureName figure = new FigureName(place, quantity, name);
    return Math.abs(figures.orNaN(figure) / NOMINAL.orNaN(figure) - 1);
  }

  private static Stream<String> slots(boolean detectorSide, Set<String> parameters) {
    return KIT.circuit().slots().stream()
        .filter(slot -> slot.nominal() != 0)
        .map(Slot::name)
        .filter(name -> parameters.contains(name.substring(name.indexOf(':') + 1)))
        .filter(
            name ->
                DETECTOR_SIDE.contains(name.substring(0, Math.max(0, name.indexOf('.'))))
                    == detectorSide)
        .filter(name -> name.indexOf('.') > 0);
  }

  static Stream<String> valuesOfTheDetectorSide() {
    return slots(true, Set.of("ohms", "track-ohms", "farads", "parallel-ohms"));
  }

  static Stream<String> resistancesOfTheDetectorSide() {
    return slots(true, Set.of("ohms", "track-ohms", "parallel-ohms"));
  }

  static Stream<String> valuesOfTheAmplifierSide() {
    return slots(false, Set.of("ohms", "track-ohms", "farads", "volts", "internal-ohms"));
  }

  @Test
  void theSlotsThatAreMovedAreThere() {
    assertThat(valuesOfTheDetectorSide()).hasSizeGreaterThanOrEqualTo(9);
    assertThat(resistancesOfTheDetectorSide()).hasSizeGreaterThanOrEqualTo(5);
    assertThat(valuesOfTheAmplifierSide()).hasSizeGreaterThanOrEqualTo(6);
  }

  @ParameterizedTest
  @MethodSource("valuesOfTheDetectorSide")
  void aPartOfTheDetectorSideMovesTheAudioOfEveryBlock(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : AUDIO) {
      assertThat(moved(after, place, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST))
          .as("%s by %s", place, slot)
          .isGreaterThan(MOVED);
    }
  }

  @ParameterizedTest
  @MethodSource("resistancesOfTheDetectorSide")
  void aResistanceOfTheDetectorSideMovesItsDcAndNotTheAmplifiers(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : DETECTOR_DC) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.TEST))
          .as("%s by %s", place, slot)
          .isGreaterThan(MOVED);
    }
    for (String place : AMPLIFIER_DC) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL))
          .as("%s by %s", place, slot)
          .isLessThan(STILL);
    }
  }

  @ParameterizedTest
  @MethodSource("valuesOfTheAmplifierSide")
  void aPartOfTheAmplifierSideLeavesTheDetectorsDcAlone(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : DETECTOR_DC) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.TEST))
          .as("%s by %s", place, slot)
          .isLessThan(STILL);
    }
  }

  @ParameterizedTest
  @MethodSource("valuesOfTheSupply")
  void theSupplyMovesEveryDcOfTheAmplifier(String slot) {
    Figures after = withATenthMore(slot);
    for (String place : List.of("power.plus", "power.minus", "battery.rail")) {
      assertThat(moved(after, place, Quantity.DC_VOLTS, CaseName.TEST))
          .as("%s by %s", place, slot)
          .isGreaterThan(MOVED);
    }
  }

  static Stream<String> valuesOfTheSupply() {
    return Stream.of("battery.battery:volts", "battery.battery:internal-ohms");
  }
}

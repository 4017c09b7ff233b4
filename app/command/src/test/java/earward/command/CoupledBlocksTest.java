package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The whole path is one circuit: a part changed by a tenth moves the readings of every block that
 * is coupled to it, and leaves alone the DC of those that a capacitor keeps from it.
 *
 * <p>In the Lantern the wiper's capacitor divides the kit for DC: feed, detector, filter, volume
 * control and AGC on one side; amplifier, loudspeaker and supply on the other.
 */
class CoupledBlocksTest {
  /** The detector's DC hangs on its audio, which solves from another start find to 1e-9. */
  private static final TenthMore LANTERN = new TenthMore("lantern", 5e-9);

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

  private static Stream<String> slots(boolean detectorSide, Set<String> parameters) {
    return LANTERN
        .slots()
        .filter(name -> parameters.contains(name.substring(name.indexOf(':') + 1)))
        .filter(name -> name.indexOf('.') > 0)
        .filter(
            name -> DETECTOR_SIDE.contains(name.substring(0, name.indexOf('.'))) == detectorSide);
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
    LANTERN.moves(slot, AUDIO, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST);
  }

  @ParameterizedTest
  @MethodSource("resistancesOfTheDetectorSide")
  void aResistanceOfTheDetectorSideMovesItsDcAndNotTheAmplifiers(String slot) {
    LANTERN.moves(slot, DETECTOR_DC, Quantity.DC_VOLTS, CaseName.TEST);
    LANTERN.leaves(slot, AMPLIFIER_DC, Quantity.DC_VOLTS, CaseName.NO_SIGNAL);
  }

  @ParameterizedTest
  @MethodSource("valuesOfTheAmplifierSide")
  void aPartOfTheAmplifierSideLeavesTheDetectorsDcAlone(String slot) {
    LANTERN.leaves(slot, DETECTOR_DC, Quantity.DC_VOLTS, CaseName.TEST);
  }

  @ParameterizedTest
  @ValueSource(strings = {"battery.battery:volts", "battery.battery:internal-ohms"})
  void theSupplyMovesEveryDcOfTheAmplifier(String slot) {
    List<String> places = List.of("power.plus", "power.minus", "battery.rail");
    LANTERN.moves(slot, places, Quantity.DC_VOLTS, CaseName.TEST);
  }
}

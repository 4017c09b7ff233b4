package earward.block.testkit;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Regulator;
import earward.block.wiring.Caution;
import java.util.List;
import java.util.Optional;

/** The cautions without which a part must not be handed to a builder. */
final class Hazards {
  private Hazards() {}

  /**
   * Where the hazard depends on the part that was chosen: when it is there, as the code says it.
   */
  static Optional<String> onlyWhen(Caution caution) {
    return switch (caution) {
      case POLARITY -> Optional.of("capacitor.dielectric().polarised()");
      case GERMANIUM_HEAT -> Optional.of("diode.model().material() == DiodeMaterial.GERMANIUM");
      case BRIDGE_NEVER_TO_GROUND -> Optional.of("amplifier.model().bridge()");
      case HOT_PART,
          CAPACITOR_DISCHARGE,
          BATTERY_SHORT,
          LITHIUM_IN_HOLDER,
          ADAPTOR_VOLTAGE,
          GLASS_DIODE,
          HEARING,
          STATIC_DISCHARGE,
          OUTDOOR_AERIAL ->
          Optional.empty();
    };
  }

  static List<Caution> of(Device device) {
    if (device instanceof Capacitor capacitor && capacitor.dielectric().polarised()) {
      return List.of(Caution.POLARITY);
    } else if (device instanceof Battery) {
      return List.of(Caution.BATTERY_SHORT);
    } else if (device instanceof Adaptor) {
      return List.of(Caution.ADAPTOR_VOLTAGE);
    } else if (device instanceof Regulator) {
      return List.of(Caution.HOT_PART);
    } else if (device instanceof FieldEffectTransistor) {
      return List.of(Caution.STATIC_DISCHARGE);
    } else if (device instanceof Diode diode
        && diode.model().material() == DiodeMaterial.GERMANIUM) {
      return List.of(Caution.GERMANIUM_HEAT);
    } else if (device instanceof AudioAmplifier amplifier) {
      return amplifier.model().bridge()
          ? List.of(Caution.HOT_PART, Caution.BRIDGE_NEVER_TO_GROUND)
          : List.of(Caution.HOT_PART);
    }
    return List.of();
  }
}

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

/** The cautions without which a part must not be handed to a builder. */
final class Hazards {
  private Hazards() {}

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

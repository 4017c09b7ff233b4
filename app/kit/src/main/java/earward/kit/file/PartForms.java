package earward.kit.file;

import earward.block.device.AdaptorModel;
import earward.block.device.BatteryModel;
import earward.block.device.FieldEffectModel;
import earward.block.device.LoudspeakerModel;
import earward.block.device.OpAmpModel;
import earward.block.device.PartKind;
import earward.block.device.RegulatorModel;
import earward.block.device.TransistorModel;
import earward.block.quantity.Unit;

/**
 * The figures of a part as a JSON object: one form for the parts library and for what a design
 * gives inline. Figures are named in words; what is left out is infinite or not there, as the
 * model's own documentation says.
 */
final class PartForms {
  private static final double USUAL_JUNCTION_CELSIUS = 150;

  private PartForms() {}

  /**
   * The model that an object describes.
   *
   * @param usualName for a part that has no name
   * @throws DesignFileException with one sentence when a figure lacks, cannot be read, or is
   *     impossible
   */
  static FittedPart read(PartKind kind, MembersReader in, String usualName)
      throws DesignFileException {
    String name = in.text("name").orElse(usualName);
    in.find("kind");
    try {
      return switch (kind) {
        case DIODE -> DiodeForm.read(in, name);
        case AMPLIFIER -> AmplifierForm.read(in, name);
        case LOUDSPEAKER -> FittedPart.given(loudspeaker(in, name));
        case BATTERY -> FittedPart.given(battery(in, name));
        case ADAPTOR -> FittedPart.given(adaptor(in, name));
        case REGULATOR -> FittedPart.given(regulator(in, name));
        case TRANSISTOR -> FittedPart.given(transistor(in, name));
        case FIELD_EFFECT_TRANSISTOR -> FittedPart.given(fieldEffect(in, name));
        case OP_AMP -> FittedPart.given(opAmp(in, name));
      };
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static LoudspeakerModel loudspeaker(MembersReader in, String name)
      throws DesignFileException {
    return new LoudspeakerModel(
        name,
        in.requiredQuantity("rated impedance", Unit.OHM),
        in.requiredQuantity("DC resistance", Unit.OHM),
        in.quantity("DC resistance tolerance", Unit.FRACTION, 0.15),
        in.quantity("voice-coil inductance", Unit.HENRY, 0),
        in.requiredQuantity("resonance", Unit.HERTZ),
        in.requiredQuantity("mechanical Q", Unit.NUMBER),
        in.requiredQuantity("electrical Q", Unit.NUMBER),
        in.requiredQuantity("sensitivity", Unit.DECIBEL),
        in.requiredQuantity("rated power", Unit.WATT));
  }

  private static BatteryModel battery(MembersReader in, String name) throws DesignFileException {
    double newVolts = in.requiredQuantity("voltage new", Unit.VOLT);
    return new BatteryModel(
        name,
        newVolts,
        in.requiredQuantity("resistance new", Unit.OHM),
        in.requiredQuantity("voltage at end", Unit.VOLT),
        in.requiredQuantity("resistance at end", Unit.OHM),
        in.requiredQuantity("capacity", Unit.AMPERE_HOUR),
        in.requiredQuantity("capacity at", Unit.AMPERE),
        in.quantity("capacity exponent", Unit.NUMBER, 0),
        in.quantity("highest voltage", Unit.VOLT, newVolts),
        in.requiredQuantity("highest current", Unit.AMPERE));
  }

  private static AdaptorModel adaptor(MembersReader in, String name) throws DesignFileException {
    return new AdaptorModel(
        name,
        in.flag("regulated", false),
        in.requiredQuantity("rated voltage", Unit.VOLT),
        in.requiredQuantity("rated current", Unit.AMPERE),
        in.requiredQuantity("unloaded voltage", Unit.VOLT),
        in.requiredQuantity("internal resistance", Unit.OHM),
        in.quantity("ripple", Unit.VOLT, 0),
        in.quantity("ripple frequency", Unit.HERTZ, 100));
  }

  private static RegulatorModel regulator(MembersReader in, String name)
      throws DesignFileException {
    return new RegulatorModel(
        name,
        in.requiredQuantity("output", Unit.VOLT),
        in.requiredQuantity("drop-out voltage", Unit.VOLT),
        in.requiredQuantity("quiescent current", Unit.AMPERE),
        in.requiredQuantity("highest input", Unit.VOLT),
        in.requiredQuantity("highest current", Unit.AMPERE),
        in.requiredQuantity("output resistance", Unit.OHM),
        in.quantity("highest junction temperature", Unit.CELSIUS, USUAL_JUNCTION_CELSIUS),
        in.requiredQuantity("junction to air", Unit.KELVIN_PER_WATT));
  }

  private static TransistorModel transistor(MembersReader in, String name)
      throws DesignFileException {
    return new TransistorModel(
        name,
        in.flag("pnp", false),
        in.requiredQuantity("saturation current", Unit.AMPERE),
        in.requiredQuantity("current gain", Unit.NUMBER),
        in.quantity("reverse current gain", Unit.NUMBER, 1),
        in.quantity("Early voltage", Unit.VOLT, Double.POSITIVE_INFINITY),
        in.requiredQuantity("highest voltage", Unit.VOLT),
        in.requiredQuantity("highest current", Unit.AMPERE),
        in.quantity("highest junction temperature", Unit.CELSIUS, USUAL_JUNCTION_CELSIUS),
        in.requiredQuantity("junction to air", Unit.KELVIN_PER_WATT),
        in.quantity("base resistance", Unit.OHM, 1));
  }

  private static FieldEffectModel fieldEffect(MembersReader in, String name)
      throws DesignFileException {
    return new FieldEffectModel(
        name,
        in.flag("p-channel", false),
        in.requiredQuantity("saturated drain current", Unit.AMPERE),
        in.requiredQuantity("pinch-off voltage", Unit.VOLT),
        in.requiredQuantity("highest voltage", Unit.VOLT),
        in.quantity("highest junction temperature", Unit.CELSIUS, USUAL_JUNCTION_CELSIUS),
        in.requiredQuantity("junction to air", Unit.KELVIN_PER_WATT));
  }

  private static OpAmpModel opAmp(MembersReader in, String name) throws DesignFileException {
    return new OpAmpModel(
        name,
        AmplifierForm.ratio(in.requiredQuantity("open-loop gain", Unit.DECIBEL)),
        in.requiredQuantity("gain-bandwidth product", Unit.HERTZ),
        in.requiredQuantity("input resistance", Unit.OHM),
        in.requiredQuantity("output resistance", Unit.OHM),
        in.requiredQuantity("lost voltage up", Unit.VOLT),
        in.requiredQuantity("lost voltage down", Unit.VOLT),
        in.requiredQuantity("quiescent current", Unit.AMPERE),
        in.quantity("input bias current", Unit.AMPERE, 0),
        in.quantity("input noise in 1 Hz", Unit.VOLT, 0),
        in.requiredQuantity("lowest supply", Unit.VOLT),
        in.requiredQuantity("highest supply", Unit.VOLT));
  }
}

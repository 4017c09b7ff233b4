package earward.kit.file;

import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.quantity.Unit;
import java.util.Locale;

/** A diode's figures as a JSON object. */
final class DiodeForm {
  private DiodeForm() {}

  static DiodeModel read(MembersReader in, String name) throws DesignFileException {
    double saturation = in.requiredQuantity("saturation current", Unit.AMPERE);
    return new DiodeModel(
        name,
        in.choice("material", DiodeMaterial.values(), DiodeForm::key, DiodeMaterial.SILICON),
        saturation,
        in.quantity("least saturation current", Unit.AMPERE, saturation),
        in.quantity("most saturation current", Unit.AMPERE, saturation),
        in.requiredQuantity("emission coefficient", Unit.NUMBER),
        in.quantity("series resistance", Unit.OHM, 0),
        in.quantity("junction capacitance", Unit.FARAD, 0),
        in.quantity("built-in voltage", Unit.VOLT, 0.5),
        in.quantity("grading exponent", Unit.NUMBER, 0.5),
        in.quantity("leakage resistance", Unit.OHM, Double.POSITIVE_INFINITY),
        in.quantity("breakdown voltage", Unit.VOLT, 1000),
        in.quantity("recovery time", Unit.SECOND, 0));
  }

  static String key(DiodeMaterial material) {
    return material.name().toLowerCase(Locale.ROOT);
  }
}

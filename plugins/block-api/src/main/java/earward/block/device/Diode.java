package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A diode of any material. Whether the carrier drives it is found by the engine from figures.
 *
 * <p>Terminals: ANODE, CATHODE.
 *
 * @param model its figures
 */
public record Diode(DiodeModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.ANODE, Terminal.CATHODE);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter(
            "saturation-amperes",
            Unit.AMPERE,
            model.saturationAmperes(),
            ToleranceClass.SATURATION_CURRENT),
        Parameter.fixed("emission-coefficient", Unit.NUMBER, model.emissionCoefficient()),
        Parameter.fixed("series-ohms", Unit.OHM, model.seriesOhms()),
        Parameter.fixed("junction-farads", Unit.FARAD, model.junctionFarads()),
        Parameter.fixed("leakage-siemens", Unit.NUMBER, 1 / model.leakageOhms()));
  }
}

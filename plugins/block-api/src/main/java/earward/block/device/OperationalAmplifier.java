package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * An operational amplifier with one supply.
 *
 * <p>Terminals: INPUT, INVERTING, OUTPUT, SUPPLY, GROUND.
 *
 * @param model its figures
 */
public record OperationalAmplifier(OpAmpModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(
        Terminal.INPUT, Terminal.INVERTING, Terminal.OUTPUT, Terminal.SUPPLY, Terminal.GROUND);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        Parameter.fixed("open-loop-gain", Unit.NUMBER, model.openLoopGain()),
        Parameter.fixed("unity-gain-hertz", Unit.HERTZ, model.unityGainHertz()),
        new Parameter(
            "quiescent-amperes",
            Unit.AMPERE,
            model.quiescentAmperes(),
            ToleranceClass.QUIESCENT_CURRENT));
  }
}

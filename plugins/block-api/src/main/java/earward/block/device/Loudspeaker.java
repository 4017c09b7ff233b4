package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A loudspeaker, earphone or headphone.
 *
 * <p>Terminals: A, B.
 *
 * @param model its figures
 */
public record Loudspeaker(LoudspeakerModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("dc-ohms", Unit.OHM, model.dcOhms(), ToleranceClass.LOUDSPEAKER),
        Parameter.fixed("voice-coil-henries", Unit.HENRY, model.voiceCoilHenries()),
        new Parameter(
            "resonance-hertz", Unit.HERTZ, model.resonanceHertz(), ToleranceClass.LOUDSPEAKER),
        Parameter.fixed("mechanical-q", Unit.NUMBER, model.mechanicalQ()),
        Parameter.fixed("electrical-q", Unit.NUMBER, model.electricalQ()));
  }
}

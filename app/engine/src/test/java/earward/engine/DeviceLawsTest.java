package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectModel;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Regulator;
import earward.block.device.RegulatorModel;
import earward.block.device.Terminal;
import earward.block.device.Transformer;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Each device's law in the smallest circuit that has a known answer. */
class DeviceLawsTest {
  private static final double VT = 0.0256926;

  private static TrialCircuit rest(double volts) {
    return new TrialCircuit()
        .battery(volts, 1e-6, "rail-main")
        .solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of());
  }

  private static TrialCircuit biased(boolean pnp) {
    TransistorModel model =
        new TransistorModel("T", pnp, 1e-14, 100, 1, Double.POSITIVE_INFINITY, 45, 0.5, 150, 200);
    String emitter = pnp ? "rail-main" : Circuit.GROUND;
    String far = pnp ? Circuit.GROUND : "rail-main";
    return rest(9)
        .resistor("bias", 1e6, far, "base")
        .resistor("load", 4.7e3, far, "collector")
        .part(
            "amp.t",
            new BipolarTransistor(model),
            Map.of(
                Terminal.BASE, "base", Terminal.COLLECTOR, "collector", Terminal.EMITTER, emitter));
  }

  @Test
  void aTransistorAmplifiesItsBaseCurrentEitherWayRound() {
    // Ebers and Moll 1954: Ic = β·Ib in the active region, Vbe = Vt·ln(Ic/Is).
    for (boolean pnp : new boolean[] {false, true}) {
      double[] figures =
          biased(pnp)
              .want("collector", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
              .want("base", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
              .want("amp.t", Quantity.JUNCTION_CELSIUS, CaseName.NO_SIGNAL)
              .figures();
      double collector = pnp ? 9 - figures[0] : figures[0];
      double base = pnp ? 9 - figures[1] : figures[1];
      double amperes = (9 - collector) / 4.7e3;
      assertThat(amperes).isCloseTo(100 * (9 - base) / 1e6, within(1e-8));
      assertThat(base).isCloseTo(VT * Math.log(amperes / 1e-14), within(1e-4));
      assertThat(figures[2]).isCloseTo(25 + 200 * collector * amperes, within(0.01));
    }
  }

  @Test
  void aFieldEffectTransistorFollowsTheSquareLaw() {
    // i = Idss(1 − i·Rs/Vp)², Idss 10 mA, Vp 3 V, Rs 1 kΩ: the smaller root is 1.8102 mA.
    FieldEffectModel model = new FieldEffectModel("J", false, 10e-3, 3, 30, 150, 300);
    double volts =
        rest(9)
            .resistor("rs", 1e3, "source", Circuit.GROUND)
            .part(
                "amp.j",
                new FieldEffectTransistor(model),
                Map.of(
                    Terminal.GATE, Circuit.GROUND,
                    Terminal.DRAIN, "rail-main",
                    Terminal.SOURCE, "source"))
            .want("source", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
            .figure();
    double milliamperes = volts;
    assertThat(10 * Math.pow(1 - milliamperes / 3, 2)).isCloseTo(milliamperes, within(1e-6));
    assertThat(milliamperes).isBetween(1.0, 3.0);
  }

  @Test
  void anOpAmpFollowsItsInputUntilItsSupplyStopsIt() {
    OpAmpModel model = new OpAmpModel("O", 1e5, 1e6, 1e6, 100, 1.5, 0.1, 1e-3, 0, 0, 3, 30);
    for (double input : new double[] {2.0, 5.0, 8.5}) {
      double output =
          new TrialCircuit()
              .battery(9, 1e-6, "rail-main")
              .resistor("top", (9 - input) * 1e3, "rail-main", "in")
              .resistor("bottom", input * 1e3, "in", Circuit.GROUND)
              .part(
                  "amp.o",
                  new OperationalAmplifier(model),
                  Map.of(
                      Terminal.INPUT, "in",
                      Terminal.INVERTING, "out",
                      Terminal.OUTPUT, "out",
                      Terminal.SUPPLY, "rail-main",
                      Terminal.GROUND, Circuit.GROUND))
              .solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of())
              .want("out", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
              .figure();
      assertThat(output).isCloseTo(Math.min(input, 7.5), within(2e-2));
    }
  }

  @Test
  void aRegulatorHoldsUntilItDropsOut() {
    RegulatorModel model = new RegulatorModel("R", 5, 1.7, 3e-3, 35, 0.1, 0.2, 125, 180);
    for (double input : new double[] {9, 6}) {
      double[] figures =
          rest(input)
              .resistor("load", 100, "out", Circuit.GROUND)
              .part(
                  "power.r",
                  new Regulator(model),
                  Map.of(
                      Terminal.INPUT, "rail-main",
                      Terminal.GROUND, Circuit.GROUND,
                      Terminal.OUTPUT, "out"))
              .want("out", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
              .want("power.r", Quantity.JUNCTION_CELSIUS, CaseName.NO_SIGNAL)
              .figures();
      double aim = Math.min(5, input - 1.7);
      assertThat(figures[0]).isCloseTo(aim * 100 / 100.2, within(0.02));
      double watts = (input - figures[0]) * figures[0] / 100 + input * 3e-3;
      assertThat(figures[1]).isCloseTo(25 + 180 * watts, within(0.1));
    }
  }

  @Test
  void aLoudspeakerRisesAtItsResonance() {
    // Small 1972: at fs the impedance is Re(1 + Qms/Qes).
    LoudspeakerModel model = new LoudspeakerModel("L", 8, 7.2, 0.1, 0, 300, 3, 1.5, 85, 1);
    double ohms =
        new TrialCircuit()
            .battery(9, 1, "a")
            .seam("load", "a", "b")
            .two("load.ls", new Loudspeaker(model), "b", Circuit.GROUND)
            .signal(1, 0.3, 300)
            .want("seam.load", Quantity.ONWARD_OHMS)
            .figure();
    assertThat(ohms).isCloseTo(7.2 * 3, within(1e-6));
  }

  @Test
  void aTransformerShowsItsLoadByTheSquareOfItsRatio() {
    // R/n² behind the windings' own ohms; magnetising inductance too large to matter.
    double ohms =
        new TrialCircuit()
            .battery(9, 1, "a")
            .seam("next", "a", "b")
            .part(
                "next.t",
                new Transformer(1e4, 0.5, 20, 4),
                Map.of(
                    Terminal.PRIMARY_START,
                    "b",
                    Terminal.PRIMARY_END,
                    Circuit.GROUND,
                    Terminal.TOP,
                    "s",
                    Terminal.BOTTOM,
                    Circuit.GROUND))
            .resistor("next.r", 16, "s", Circuit.GROUND)
            .signal(1, 0.3, 1000)
            .want("seam.next", Quantity.ONWARD_OHMS)
            .figure();
    assertThat(ohms).isCloseTo(20 + (16 + 4) / 0.25, within(1e-2));
  }
}

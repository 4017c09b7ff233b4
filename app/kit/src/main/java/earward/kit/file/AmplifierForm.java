package earward.kit.file;

import earward.block.device.AmplifierGain;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierRatings;
import earward.block.device.AmplifierTraits;
import earward.block.device.ControlPoint;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import earward.kit.parts.SwingFit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** An audio amplifier IC's data as a JSON object. Gains are given in dB. */
final class AmplifierForm {
  private static final String COMPENSATION = "compensation";
  private static final String OPEN_LOOP = "open-loop gain";
  private static final double MOST_DECIBELS = 160;
  private static final String FEEDBACK = "feedback resistor";

  private AmplifierForm() {}

  static FittedPart read(MembersReader in, String name) throws DesignFileException {
    double rejection = in.quantity("ripple rejection", Unit.DECIBEL, 0);
    boolean bridge = in.flag("bridge", false);
    double restOffset = in.quantity("rest offset", Unit.VOLT, 0);
    Optional<SwingFit> fit = SwingForm.fit(in, bridge);
    AmplifierModel model =
        new AmplifierModel(
            name,
            bridge,
            gain(in),
            SwingForm.read(in, fit, restOffset),
            ratings(in),
            in.requiredQuantity("quiescent current", Unit.AMPERE),
            in.quantity("rest share of the supply", Unit.FRACTION, 0.5),
            restOffset,
            in.requiredQuantity("input resistance", Unit.OHM),
            in.quantity("input bias current", Unit.AMPERE, 0),
            rejection,
            in.quantity("ripple rejection without capacitor", Unit.DECIBEL, rejection),
            in.quantity("input noise", Unit.VOLT, 0),
            in.text("package").orElse(""),
            PinsForm.read(in),
            new AmplifierTraits(
                in.flag("output network needed", false),
                in.flag("switching", false),
                in.quantity("highest input", Unit.VOLT, Double.POSITIVE_INFINITY)));
    return new FittedPart(model, fit.map(SwingFit::report));
  }

  /** The plain number of a gain in decibels of voltage. */
  static double ratio(double decibels) {
    return Math.pow(10, decibels / 20);
  }

  private static AmplifierGain gain(MembersReader in) throws DesignFileException {
    OptionalDouble fixed = in.quantity("gain", Unit.DECIBEL);
    OptionalDouble feedback = in.quantity(FEEDBACK, Unit.OHM);
    if (fixed.isPresent() == feedback.isPresent()) {
      throw DesignFileException.of(
          "missing-member",
          in.fileName(),
          in.object().at(),
          in.what()
              + (fixed.isPresent() ? " has both 'gain' and '" : " has neither 'gain' nor '")
              + FEEDBACK
              + "'; wanted one of them: a fixed gain, or the resistor with which parts outside"
              + " set it");
    }
    return new AmplifierGain(
        fixed.isPresent() ? ratio(within(in, "gain", fixed.getAsDouble())) : 1,
        feedback.orElse(Double.POSITIVE_INFINITY),
        ratio(within(in, OPEN_LOOP, in.requiredQuantity(OPEN_LOOP, Unit.DECIBEL))),
        in.requiredQuantity("bandwidth", Unit.HERTZ),
        compensation(in),
        control(in));
  }

  private static double within(MembersReader in, String name, double decibels)
      throws DesignFileException {
    if (decibels > 0 && decibels <= MOST_DECIBELS) {
      return decibels;
    }
    throw in.fault(
        "impossible-value",
        in.find(name).orElseThrow(),
        name,
        "is "
            + QuantityText.format(decibels, Unit.DECIBEL, Locale.ROOT)
            + "; it must be above 0 dB, at most "
            + QuantityText.format(MOST_DECIBELS, Unit.DECIBEL, Locale.ROOT));
  }

  /** Upper edge times capacitance, from one pair of them. */
  private static double compensation(MembersReader in) throws DesignFileException {
    Optional<MembersReader> pair = in.open(COMPENSATION);
    if (pair.isEmpty()) {
      return 0;
    }
    return pair.get().requiredQuantity("capacitor", Unit.FARAD)
        * pair.get().requiredQuantity("bandwidth", Unit.HERTZ);
  }

  private static List<ControlPoint> control(MembersReader in) throws DesignFileException {
    List<ControlPoint> curve = new ArrayList<>();
    for (Json item : in.items("control")) {
      MembersReader point =
          MembersReader.of(item, in.source(), "a point of 'control' of " + in.what());
      curve.add(
          new ControlPoint(
              point.requiredQuantity("voltage", Unit.VOLT),
              point.requiredQuantity("gain", Unit.DECIBEL)));
    }
    return curve;
  }

  private static AmplifierRatings ratings(MembersReader in) throws DesignFileException {
    return new AmplifierRatings(
        in.requiredQuantity("lowest supply", Unit.VOLT),
        in.requiredQuantity("highest supply", Unit.VOLT),
        in.requiredQuantity("least load", Unit.OHM),
        in.requiredQuantity("highest output current", Unit.AMPERE),
        in.quantity("highest junction temperature", Unit.CELSIUS, 150),
        in.requiredQuantity("junction to air", Unit.KELVIN_PER_WATT),
        in.requiredQuantity("junction to case", Unit.KELVIN_PER_WATT));
  }
}

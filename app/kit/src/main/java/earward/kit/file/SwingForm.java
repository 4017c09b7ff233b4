package earward.kit.file;

import earward.block.device.OutputSwing;
import earward.block.quantity.Unit;
import earward.kit.parts.OutputPower;
import earward.kit.parts.SwingFit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What an amplifier loses of its supply: given, or fitted to the typical ones of its {@code output
 * powers} where no lost voltage is given.
 */
final class SwingForm {
  private static final String POWERS = "output powers";
  private static final String UP = "lost voltage up";
  private static final String UP_OHMS = "lost voltage up per ampere";
  private static final String DOWN = "lost voltage down";
  private static final String DOWN_OHMS = "lost voltage down per ampere";

  private SwingForm() {}

  static OutputSwing read(MembersReader in, Optional<SwingFit> fit, double restOffsetVolts)
      throws DesignFileException {
    double withoutBootstrap = in.quantity("lost voltage without bootstrap", Unit.VOLT, 0);
    if (fit.isPresent()) {
      return fit.get().swing(restOffsetVolts, withoutBootstrap);
    }
    return new OutputSwing(
        in.requiredQuantity(UP, Unit.VOLT),
        in.quantity(UP_OHMS, Unit.OHM, 0),
        in.requiredQuantity(DOWN, Unit.VOLT),
        in.quantity(DOWN_OHMS, Unit.OHM, 0),
        withoutBootstrap);
  }

  /** The fit, where the object has output powers and no lost voltage. */
  static Optional<SwingFit> fit(MembersReader in, boolean bridge) throws DesignFileException {
    List<OutputPower> powers = powers(in);
    if (powers.isEmpty() || in.find(UP).isPresent()) {
      return Optional.empty();
    }
    for (String fitted : List.of(UP_OHMS, DOWN, DOWN_OHMS)) {
      Optional<Json> given = in.find(fitted);
      if (given.isPresent()) {
        throw in.fault(
            "given-and-fitted",
            given.get(),
            fitted,
            "is given while '" + UP + "' is left to the fit; wanted all of them or none");
      }
    }
    try {
      return Optional.of(SwingFit.of(powers, bridge));
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static List<OutputPower> powers(MembersReader in) throws DesignFileException {
    List<OutputPower> powers = new ArrayList<>();
    for (Json item : in.items(POWERS)) {
      MembersReader one = MembersReader.of(item, in.source(), "an output power of " + in.what());
      try {
        powers.add(
            new OutputPower(
                one.requiredQuantity("supply", Unit.VOLT),
                one.requiredQuantity("load", Unit.OHM),
                one.requiredQuantity("power", Unit.WATT),
                one.quantity("distortion", Unit.FRACTION, 0.1),
                Meaning.typical(one)));
      } catch (IllegalArgumentException e) {
        throw one.impossible(e);
      }
    }
    return powers;
  }
}

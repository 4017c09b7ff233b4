package earward.kit.path;

import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.check.Severity;
import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.device.Device;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.WiredPart;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the program refuses whatever the figures say: a front end that is not battery or SELV
 * powered, and a supply that can bring more than {@value #MOST_VOLTS} V DC.
 */
final class SafetyRules {
  /** Highest supply, V DC (the project's own limit, well below the 60 V DC of SELV). */
  static final double MOST_VOLTS = 26;

  private SafetyRules() {}

  static Optional<Finding> frontEnd(KitDesign design) {
    FrontEndSupply answer = design.conditions().frontEndSupply();
    if (answer.allowed()) {
      return Optional.empty();
    }
    String wanted =
        "; a kit is joined only to a front end on a battery (\"battery\") or on an adaptor with"
            + " safety extra-low voltage (\"selv adaptor\")";
    String sentence =
        answer == FrontEndSupply.NOT_ANSWERED
            ? "The design does not say what powers the front end" + wanted + "."
            : "The front end is powered by something else than a battery or a SELV adaptor, and a"
                + " mains-connected or hot chassis can kill"
                + wanted
                + ".";
    return Optional.of(Finding.of(Severity.STOP, "front-end-supply", "conditions", sentence));
  }

  static List<Finding> supplies(List<PlacedBlock> blocks) {
    List<Finding> findings = new ArrayList<>();
    for (PlacedBlock block : blocks) {
      double sum = 0;
      for (WiredPart part : block.description().wiring().parts()) {
        sum += highestVolts(part.device()).orElse(0);
      }
      if (sum > MOST_VOLTS) {
        findings.add(tooHigh(block, sum));
      }
    }
    return findings;
  }

  /** The most that a source can bring: wrong cells in its holder, or no load at highest mains. */
  static OptionalDouble highestVolts(Device device) {
    if (device instanceof Battery battery) {
      return OptionalDouble.of(battery.model().highestVolts());
    }
    return device instanceof Adaptor adaptor
        ? OptionalDouble.of(adaptor.model().unloadedVolts())
        : OptionalDouble.empty();
  }

  private static Finding tooHigh(PlacedBlock block, double volts) {
    String sentence =
        "Supply '"
            + block.id()
            + "' can bring "
            + QuantityText.format(volts, Unit.VOLT, Locale.ROOT)
            + " (unloaded, highest mains or wrong cells); a kit is not built above "
            + QuantityText.format(MOST_VOLTS, Unit.VOLT, Locale.ROOT)
            + " DC; choose a lower supply.";
    FigureName figure = new FigureName(block.id(), Quantity.SUPPLY_VOLTS, CaseName.HIGHEST_SUPPLY);
    return new Finding(
        Severity.STOP,
        "supply-over-limit",
        block.id(),
        sentence,
        "limit of this program for battery and SELV kits",
        Optional.of(new Measured(figure, volts, MOST_VOLTS)));
  }
}

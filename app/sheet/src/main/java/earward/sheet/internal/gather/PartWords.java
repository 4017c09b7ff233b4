package earward.sheet.internal.gather;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Fuse;
import earward.block.device.Inductor;
import earward.block.device.Loudspeaker;
import earward.block.device.MeterMovement;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Parameter;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.device.ToleranceClass;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import earward.block.quantity.Unit;
import earward.kit.design.Tolerances;
import earward.sheet.internal.section.Words;
import java.util.Locale;
import java.util.OptionalDouble;

/** A part's value and rating, as they are ordered. */
final class PartWords {
  private final Words words;
  private final Tolerances tolerances;

  PartWords(Words words, Tolerances tolerances) {
    this.words = words;
    this.tolerances = tolerances;
  }

  /** A quantity, or the part type. */
  String value(Device device) {
    if (device instanceof Resistor resistor) {
      return quantity(resistor.ohms(), Unit.OHM);
    } else if (device instanceof Capacitor capacitor) {
      return quantity(capacitor.farads(), Unit.FARAD);
    } else if (device instanceof Potentiometer potentiometer) {
      return quantity(potentiometer.trackOhms(), Unit.OHM);
    } else if (device instanceof Inductor inductor) {
      return quantity(inductor.henries(), Unit.HENRY);
    } else if (device instanceof Fuse fuse) {
      return quantity(fuse.ratedAmperes(), Unit.AMPERE);
    } else if (device instanceof MeterMovement meter) {
      return quantity(meter.fullScaleAmperes(), Unit.AMPERE);
    } else if (device instanceof TunedFeed feed) {
      return words.text(
          "value.tuned-feed",
          "ohms",
          quantity(feed.parallelOhms(), Unit.OHM),
          "quality",
          quantity(feed.quality(), Unit.NUMBER));
    } else if (device instanceof Transformer transformer) {
      return words.text("value.transformer", "ratio", quantity(transformer.ratio(), Unit.NUMBER));
    }
    return typeName(device);
  }

  private String typeName(Device device) {
    if (device instanceof Diode diode) {
      return diode.model().name();
    } else if (device instanceof AudioAmplifier amplifier) {
      return amplifier.model().name();
    } else if (device instanceof Loudspeaker loudspeaker) {
      return loudspeaker.model().name();
    } else if (device instanceof Battery battery) {
      return battery.model().name();
    } else if (device instanceof Adaptor adaptor) {
      return adaptor.model().name();
    } else if (device instanceof Regulator regulator) {
      return regulator.model().name();
    } else if (device instanceof BipolarTransistor transistor) {
      return transistor.model().name();
    } else if (device instanceof FieldEffectTransistor transistor) {
      return transistor.model().name();
    } else if (device instanceof OperationalAmplifier amplifier) {
      return amplifier.model().name();
    }
    return device instanceof Switch ? words.text("value.switch") : "";
  }

  /** What kind of part it is. */
  String kind(Device device) {
    return words.text(
        "kind."
            + device
                .getClass()
                .getSimpleName()
                .replaceAll("(?<=.)([A-Z])", "-$1")
                .toLowerCase(Locale.ROOT));
  }

  /** What else must be ordered; may be empty. */
  String rating(Device device, String partName) {
    if (device instanceof Resistor resistor) {
      return rated(words.numbers().plain(resistor.ratedWatts(), Unit.WATT), device, partName);
    } else if (device instanceof Capacitor capacitor) {
      String kind = "dielectric." + key(capacitor.dielectric());
      String volts = quantity(capacitor.ratedVolts(), Unit.VOLT);
      return rated(words.text(kind) + ", " + volts, device, partName);
    } else if (device instanceof Potentiometer potentiometer) {
      String taper = words.text("taper." + key(potentiometer.taper()));
      return potentiometer.trimmer() ? words.text("rating.trimmer", "taper", taper) : taper;
    } else if (device instanceof Diode diode) {
      return words.text("material." + key(diode.model().material()));
    } else if (device instanceof AudioAmplifier amplifier) {
      return amplifier.model().packageName();
    } else if (device instanceof Loudspeaker loudspeaker) {
      return quantity(loudspeaker.model().ratedOhms(), Unit.OHM)
          + ", "
          + words.numbers().plain(loudspeaker.model().ratedWatts(), Unit.WATT);
    } else if (device instanceof Battery battery) {
      return words.text("rating.battery", "volts", quantity(battery.model().newVolts(), Unit.VOLT));
    } else if (device instanceof Adaptor adaptor) {
      return words.text(
          adaptor.model().regulated() ? "rating.regulated" : "rating.unregulated",
          "volts",
          quantity(adaptor.model().ratedVolts(), Unit.VOLT),
          "amperes",
          quantity(adaptor.model().ratedAmperes(), Unit.AMPERE));
    }
    return "";
  }

  private String rated(String rating, Device device, String partName) {
    OptionalDouble share = tolerance(device, partName);
    if (share.isEmpty()) {
      return rating;
    }
    return words.text(
        "rating.tolerance",
        "rating",
        rating,
        "share",
        quantity(share.getAsDouble(), Unit.FRACTION));
  }

  /** The share by which its main figure may differ. */
  OptionalDouble tolerance(Device device, String partName) {
    for (Parameter parameter : device.parameters()) {
      if (parameter.tolerance() != ToleranceClass.FIXED) {
        return OptionalDouble.of(tolerances.fraction(parameter.tolerance(), partName));
      }
    }
    return OptionalDouble.empty();
  }

  private String quantity(double si, Unit unit) {
    return words.numbers().text(si, unit);
  }

  private static String key(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}

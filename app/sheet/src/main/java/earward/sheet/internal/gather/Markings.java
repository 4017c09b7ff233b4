package earward.sheet.internal.gather;

import earward.block.device.AudioAmplifier;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.Fuse;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.quantity.Unit;
import earward.kit.parts.BandColour;
import earward.kit.parts.Marking;
import earward.sheet.content.PartMarking;
import earward.sheet.content.PartMarking.Body;
import earward.sheet.content.PartMarking.Printed;
import earward.sheet.content.PartMarking.Unmarked;
import earward.sheet.internal.section.Words;
import java.util.List;
import java.util.Optional;

/** What is seen on a part. */
final class Markings {
  private final Words words;
  private final PartWords parts;

  Markings(Words words, PartWords parts) {
    this.words = words;
    this.parts = parts;
  }

  PartMarking of(Device device, String partName) {
    if (device instanceof Resistor resistor) {
      return resistor(resistor, partName);
    } else if (device instanceof Capacitor capacitor) {
      return capacitor(capacitor, partName);
    } else if (device instanceof Potentiometer potentiometer) {
      String code = Marking.resistorCode(potentiometer.trackOhms());
      return new Printed(Body.OTHER, code, code);
    } else if (device instanceof Diode) {
      return new Printed(Body.DIODE, parts.value(device), parts.value(device));
    } else if (device instanceof AudioAmplifier || device instanceof OperationalAmplifier) {
      // the library may say after the type how it is used: TDA2822M bridge
      String print = parts.value(device).split(" ", 2)[0];
      return new Printed(Body.INTEGRATED_CIRCUIT, print, print);
    } else if (device instanceof Fuse) {
      return new Printed(Body.OTHER, parts.value(device), parts.value(device));
    }
    return new Unmarked();
  }

  private PartMarking resistor(Resistor resistor, String partName) {
    String code = Marking.resistorCode(resistor.ohms());
    double share = parts.tolerance(resistor, partName).orElse(0);
    Optional<List<BandColour>> bands = Marking.colourBands(resistor.ohms(), share);
    return bands.isPresent()
        ? new PartMarking.Bands(bands.get(), code)
        : new Printed(Body.OTHER, code, code);
  }

  private PartMarking capacitor(Capacitor capacitor, String partName) {
    String letters = Marking.capacitorLetters(capacitor.farads());
    if (capacitor.dielectric() == Dielectric.ELECTROLYTIC) {
      String value = parts.value(capacitor);
      String volts = words.numbers().text(capacitor.ratedVolts(), Unit.VOLT);
      return new Printed(Body.ELECTROLYTIC_CAPACITOR, value, value + " " + volts);
    }
    Body body =
        capacitor.dielectric() == Dielectric.CERAMIC ? Body.CERAMIC_CAPACITOR : Body.FILM_CAPACITOR;
    Optional<String> code = Marking.capacitorCode(capacitor.farads());
    if (code.isEmpty()) {
      return new Printed(body, letters, letters);
    }
    String tolerance =
        Marking.toleranceLetter(parts.tolerance(capacitor, partName).orElse(0)).orElse("");
    String print = code.get() + tolerance;
    return new Printed(
        body, print, words.text("marking.printed", "print", print, "other", letters));
  }
}

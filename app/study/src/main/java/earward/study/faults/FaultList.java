package earward.study.faults;

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
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import earward.engine.CircuitPart;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The faults of a kit, from its parts' kinds. Used once. */
final class FaultList {
  private static final double[] DRY_OHMS = {100, 10e3, 1e6};
  private static final double OPEN_LINK_OHMS = 1e12;
  private static final double BRIDGE_OHMS = 0.01;
  private static final double RESISTOR_READ_WRONG = 10;

  private final List<CircuitPart> parts;
  private final FaultCircuit circuit;
  private final Map<String, Fault> faults = new LinkedHashMap<>();

  private FaultList(List<CircuitPart> parts, FaultCircuit circuit) {
    this.parts = parts;
    this.circuit = circuit;
  }

  /** All faults, the probable ones first; their probabilities add up to 1. */
  static List<Fault> of(List<CircuitPart> parts, FaultCircuit circuit) {
    FaultList list = new FaultList(parts, circuit);
    parts.stream().filter(part -> part.device().fitted()).forEach(list::ofPart);
    list.exchanged();
    return list.weighted();
  }

  private List<Fault> weighted() {
    Map<FaultClass, Integer> counts = new EnumMap<>(FaultClass.class);
    faults.values().forEach(fault -> counts.merge(fault.kind(), 1, Integer::sum));
    double whole = counts.keySet().stream().mapToDouble(FaultClass::share).sum();
    List<Fault> weighted = new ArrayList<>();
    for (Fault fault : faults.values()) {
      weighted.add(fault.with(fault.kind().share() / whole / counts.getOrDefault(fault.kind(), 1)));
    }
    weighted.sort(java.util.Comparator.comparingDouble(Fault::prior).reversed());
    return weighted;
  }

  private void add(
      CircuitPart part, String what, FaultClass kind, String words, Map<String, Double> values) {
    add(List.of(part.name()), part.name() + ":" + what, kind, words, values);
  }

  private void add(
      List<String> about, String id, FaultClass kind, String words, Map<String, Double> values) {
    faults.put(id, new Fault(id, about, kind, words, values, 0));
  }

  private void slot(CircuitPart part, String fault, FaultClass kind, String words) {
    add(part, fault, kind, words, Map.of(part.name() + ":" + fault, 1.0));
  }

  private void ofPart(CircuitPart part) {
    Device device = part.device();
    if (device instanceof Resistor resistor) {
      joints(part, "ohms", resistor.ohms());
      misread(part, "ohms", resistor.ohms());
    } else if (device instanceof Capacitor capacitor) {
      joints(part, "series-ohms", capacitor.seriesOhms());
      misread(part, "farads", capacitor.farads());
      if (capacitor.dielectric().polarised()) {
        slot(part, "reversed", FaultClass.DIRECTION, "is the wrong way round");
      }
    } else if (device instanceof Diode diode) {
      joints(part, "series-ohms", diode.model().seriesOhms());
      slot(part, "reversed", FaultClass.DIRECTION, "is the wrong way round");
    } else if (device instanceof Inductor inductor) {
      joints(part, "series-ohms", inductor.seriesOhms());
    } else if (device instanceof Potentiometer) {
      potentiometer(part);
    } else if (device instanceof TunedFeed feed) {
      slot(part, "open", FaultClass.JOINT, "has an open winding or joint");
      slot(part, "short", FaultClass.JOINT, "is shorted");
      value(part, "parallel-ohms", feed.parallelOhms() / 3, "is a wrong can, of a third of the Q");
    } else if (device instanceof Loudspeaker speaker) {
      slot(part, "open", FaultClass.OFF_BOARD, "is open or not connected");
      slot(part, "short", FaultClass.OFF_BOARD, "or its wires are shorted");
      value(part, "dc-ohms", speaker.model().dcOhms() / 2, "has half the impedance");
    } else {
      ofOthers(part);
    }
  }

  private void ofOthers(CircuitPart part) {
    Device device = part.device();
    if (device instanceof Battery battery) {
      slot(part, "open", FaultClass.OFF_BOARD, "makes no contact");
      slot(part, "reversed", FaultClass.DIRECTION, "is the wrong way round");
      add(
          part,
          "end",
          FaultClass.OFF_BOARD,
          "is at its end",
          Map.of(
              part.name() + ":volts", battery.model().endVolts(),
              part.name() + ":internal-ohms", battery.model().endOhms()));
    } else if (device instanceof Adaptor adaptor) {
      slot(part, "open", FaultClass.OFF_BOARD, "makes no contact");
      slot(part, "reversed", FaultClass.DIRECTION, "has the wrong polarity");
      add(
          part,
          "low",
          FaultClass.OFF_BOARD,
          "gives a third too little",
          Map.of(part.name() + ":volts", adaptor.model().ratedVolts() * 2 / 3));
    } else if (device instanceof Switch || device instanceof Fuse) {
      slot(part, "open", FaultClass.OFF_BOARD, "is open");
    } else if (device instanceof MeterMovement) {
      slot(part, "open", FaultClass.OFF_BOARD, "is open");
      slot(part, "reversed", FaultClass.DIRECTION, "is the wrong way round");
    } else if (device instanceof AudioAmplifier
        || device instanceof OperationalAmplifier
        || device instanceof Regulator
        || device instanceof BipolarTransistor
        || device instanceof FieldEffectTransistor) {
      slot(part, "open", FaultClass.PART, "is dead or missing");
      slot(part, "reversed", FaultClass.DIRECTION, "is turned round");
      pins(part);
    } else if (device instanceof Transformer) {
      slot(part, "open", FaultClass.JOINT, "is open");
      slot(part, "reversed", FaultClass.DIRECTION, "is turned round");
    }
  }

  private void value(CircuitPart part, String parameter, double value, String words) {
    add(
        part,
        parameter + "-" + String.format(Locale.ROOT, "%.3g", value),
        FaultClass.VALUE,
        words,
        Map.of(part.name() + ":" + parameter, value));
  }

  private void joints(CircuitPart part, String series, double nominal) {
    slot(part, "open", FaultClass.JOINT, "is open or missing");
    slot(part, "short", FaultClass.JOINT, "is bridged by solder");
    for (double ohms : DRY_OHMS) {
      add(
          part,
          "dry-" + (long) ohms,
          FaultClass.JOINT,
          "has a dry joint of some " + spoken(ohms),
          Map.of(part.name() + ":" + series, nominal + ohms));
    }
  }

  private static String spoken(double ohms) {
    return ohms >= 1e6
        ? (long) (ohms / 1e6) + " MΩ"
        : ohms >= 1e3 ? (long) (ohms / 1e3) + " kΩ" : (long) ohms + " Ω";
  }

  private void misread(CircuitPart part, String parameter, double nominal) {
    value(part, parameter, nominal * RESISTOR_READ_WRONG, "is ten times too large (misread)");
    value(part, parameter, nominal / RESISTOR_READ_WRONG, "is ten times too small (misread)");
  }

  private void potentiometer(CircuitPart part) {
    links(part, FaultClass.OFF_BOARD);
    slot(part, "reversed", FaultClass.OFF_BOARD, "has its outer lugs exchanged");
    Potentiometer track = (Potentiometer) part.device();
    value(part, "track-ohms", track.trackOhms() * 10, "is ten times too large (misread)");
    value(part, "track-ohms", track.trackOhms() / 10, "is ten times too small (misread)");
    bridges(part);
  }

  private void pins(CircuitPart part) {
    links(part, FaultClass.JOINT);
    bridges(part);
  }

  private void links(CircuitPart part, FaultClass kind) {
    circuit
        .links()
        .forEach(
            (lead, slot) -> {
              if (lead.startsWith(part.name() + "/")) {
                String end = lead.substring(part.name().length() + 1).toLowerCase(Locale.ROOT);
                add(
                    part,
                    "open-" + end,
                    kind,
                    "is open at its " + end.replace('_', ' ') + " lead",
                    Map.of(slot, OPEN_LINK_OHMS));
              }
            });
  }

  private void bridges(CircuitPart part) {
    for (String slot : circuit.bridges().getOrDefault(part.name(), List.of())) {
      String pins = slot.substring(slot.lastIndexOf(".bridge-") + 8, slot.lastIndexOf(':'));
      add(
          part,
          "bridge-" + pins,
          FaultClass.JOINT,
          "has a bridge of solder between pins " + pins.replace("-", " and "),
          Map.of(slot, BRIDGE_OHMS));
    }
  }

  /** Two parts of this kit that look alike, each in the other's place. */
  private void exchanged() {
    for (int i = 0; i < parts.size(); i++) {
      for (int j = i + 1; j < parts.size(); j++) {
        exchange(parts.get(i), parts.get(j));
      }
    }
  }

  private void exchange(CircuitPart one, CircuitPart other) {
    Device a = one.device();
    Device b = other.device();
    if (a instanceof Resistor left && b instanceof Resistor right && one.device().fitted()) {
      exchange(one, other, "ohms", left.ohms(), right.ohms());
    } else if (a instanceof Capacitor left
        && b instanceof Capacitor right
        && left.dielectric() == right.dielectric()) {
      exchange(one, other, "farads", left.farads(), right.farads());
    } else if (a instanceof Diode left && b instanceof Diode right && !left.equals(right)) {
      add(
          List.of(one.name(), other.name()),
          one.name() + ":exchanged-" + other.name(),
          FaultClass.VALUE,
          "are exchanged",
          Map.of(
              one.name() + ":saturation-amperes", right.model().saturationAmperes(),
              one.name() + ":emission-coefficient", right.model().emissionCoefficient(),
              one.name() + ":series-ohms", right.model().seriesOhms(),
              one.name() + ":junction-farads", right.model().junctionFarads(),
              other.name() + ":saturation-amperes", left.model().saturationAmperes(),
              other.name() + ":emission-coefficient", left.model().emissionCoefficient(),
              other.name() + ":series-ohms", left.model().seriesOhms(),
              other.name() + ":junction-farads", left.model().junctionFarads()));
    }
  }

  private void exchange(
      CircuitPart one, CircuitPart other, String parameter, double left, double right) {
    if (left != right) {
      add(
          List.of(one.name(), other.name()),
          one.name() + ":exchanged-" + other.name(),
          FaultClass.VALUE,
          "are exchanged",
          Map.of(one.name() + ":" + parameter, right, other.name() + ":" + parameter, left));
    }
  }
}

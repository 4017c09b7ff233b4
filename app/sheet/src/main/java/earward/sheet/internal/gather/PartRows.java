package earward.sheet.internal.gather;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.Loudspeaker;
import earward.block.device.Pin;
import earward.block.device.Potentiometer;
import earward.block.device.Terminal;
import earward.block.quantity.Unit;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.PartRow;
import earward.sheet.content.PinOut;
import earward.sheet.content.PinOut.PinRow;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The parts list, block by block, each in its fitting order; and the pins of what has many. */
final class PartRows {
  private final Assembly assembly;
  private final BlockNames names;
  private final Words words;
  private final PartWords parts;
  private final Markings markings;
  private final Joints joints;

  PartRows(Assembly assembly, BlockNames names, Words words) {
    this.assembly = assembly;
    this.names = names;
    this.words = words;
    this.parts = new PartWords(words, assembly.design().tolerances());
    this.markings = new Markings(words, parts);
    this.joints = new Joints(assembly, words);
  }

  /** The reference of a part, or its id in the block where it has none. */
  static String reference(Assembly assembly, PlacedBlock block, String partId) {
    return assembly.references().ofPart(block.partName(partId)).orElse(partId);
  }

  /** A part's value, as it is written beside its symbol. */
  String value(Device device) {
    return parts.value(device);
  }

  List<PartRow> rows() {
    List<PartRow> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (String id : block.description().wiring().fittingOrder()) {
        block.description().wiring().part(id).ifPresent(part -> rows.add(row(block, part)));
      }
    }
    return rows;
  }

  private PartRow row(PlacedBlock block, WiredPart part) {
    String name = block.partName(part);
    return new PartRow(
        names.of(block),
        reference(assembly, block, part.id()),
        parts.value(part.device()),
        parts.rating(part.device(), name),
        markings.of(part.device(), name),
        names.part(block, part.id()),
        fitting(block, part));
  }

  private String fitting(PlacedBlock block, WiredPart part) {
    Device device = part.device();
    if (device instanceof Capacitor capacitor && capacitor.dielectric().polarised()) {
      return words.text(
          "fit.electrolytic",
          "plus",
          to(block, part, Terminal.A),
          "minus",
          to(block, part, Terminal.B));
    } else if (device instanceof Diode) {
      return words.text("fit.diode", "cathode", to(block, part, Terminal.CATHODE));
    } else if (device instanceof Potentiometer track) {
      return track(block, part, track.tapped());
    } else if (device instanceof Battery || device instanceof Adaptor) {
      return words.text(
          "fit.supply",
          "plus",
          to(block, part, Terminal.PLUS),
          "minus",
          to(block, part, Terminal.MINUS));
    } else if (device instanceof Loudspeaker) {
      return words.text(
          "fit.loudspeaker",
          "one",
          to(block, part, Terminal.A),
          "other",
          to(block, part, Terminal.B));
    } else if (device instanceof AudioAmplifier amplifier) {
      return Double.isInfinite(amplifier.heatSinkKelvinPerWatt())
          ? words.text("fit.amplifier")
          : words.text(
              "fit.amplifier-cooled",
              "sink",
              words.numbers().text(amplifier.heatSinkKelvinPerWatt(), Unit.KELVIN_PER_WATT));
    }
    return "";
  }

  private String track(PlacedBlock block, WiredPart part, boolean tapped) {
    String top = to(block, part, Terminal.TOP);
    String wiper = to(block, part, Terminal.WIPER);
    String bottom = to(block, part, Terminal.BOTTOM);
    return tapped
        ? words.text(
            "fit.tapped-potentiometer",
            "top",
            top,
            "wiper",
            wiper,
            "bottom",
            bottom,
            "tap",
            to(block, part, Terminal.TAP))
        : words.text("fit.potentiometer", "top", top, "wiper", wiper, "bottom", bottom);
  }

  private String to(PlacedBlock block, WiredPart part, Terminal terminal) {
    String local = part.nodes().get(terminal);
    String leads = local == null ? "" : joints.from(block.partName(part), block.globalNode(local));
    return leads.isEmpty() ? words.text("joint.nothing") : leads;
  }

  List<PinOut> pinOuts() {
    List<PinOut> pinOuts = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (WiredPart part : block.description().wiring().partsOf(AudioAmplifier.class)) {
        pinOuts.add(pinOut(block, part, (AudioAmplifier) part.device()));
      }
    }
    return pinOuts;
  }

  private PinOut pinOut(PlacedBlock block, WiredPart part, AudioAmplifier amplifier) {
    List<PinRow> rows = new ArrayList<>();
    List<Pin> pins = new ArrayList<>(amplifier.pins());
    pins.sort(Comparator.comparingInt(Pin::number));
    for (Pin pin : pins) {
      String key = pin.terminal().name().toLowerCase(Locale.ROOT).replace('_', '-');
      String leads =
          Optional.ofNullable(part.nodes().get(pin.terminal()))
              .map(local -> joints.from(block.partName(part), block.globalNode(local)))
              .orElse("");
      rows.add(new PinRow(pin.number(), words.text("terminal." + key), leads));
    }
    return new PinOut(
        reference(assembly, block, part.id()),
        amplifier.model().name(),
        amplifier.model().packageName(),
        rows);
  }
}

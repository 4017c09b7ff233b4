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
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.quantity.Unit;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.PartRow;
import earward.sheet.content.PinOut;
import earward.sheet.content.PinOut.PinRow;
import earward.sheet.content.ShoppingRow;
import earward.sheet.content.StageRow;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
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

  /** The parts of some blocks, lowest first: a board lies flat while its low parts are soldered. */
  List<StageRow.Part> lowestFirst(List<PlacedBlock> blocks) {
    record Fitted(double height, StageRow.Part part) {}
    List<Fitted> fitted = new ArrayList<>();
    for (PlacedBlock block : blocks) {
      for (String id : block.description().wiring().fittingOrder()) {
        WiredPart part = block.description().wiring().part(id).orElseThrow();
        fitted.add(
            new Fitted(
                Heights.millimetres(part.device()),
                new StageRow.Part(
                    reference(assembly, block, id),
                    parts.value(part.device()),
                    names.part(block, id))));
      }
    }
    fitted.sort(Comparator.comparingDouble(Fitted::height));
    return fitted.stream().map(Fitted::part).toList();
  }

  /** What is bought: parts of one value and rating together. */
  List<ShoppingRow> shopping() {
    record Kind(String what, String rating, double spareShare) {}
    Map<Kind, List<String>> bought = new LinkedHashMap<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (String id : block.description().wiring().fittingOrder()) {
        WiredPart part = block.description().wiring().part(id).orElseThrow();
        Device device = part.device();
        Kind kind =
            new Kind(
                parts.kind(device) + " " + parts.value(device),
                parts.rating(device, block.partName(part)),
                Heights.spareShare(device));
        bought.computeIfAbsent(kind, any -> new ArrayList<>()).add(reference(assembly, block, id));
      }
    }
    return bought.entrySet().stream()
        .map(
            each ->
                new ShoppingRow(
                    each.getKey().what().strip(),
                    each.getKey().rating(),
                    each.getValue(),
                    each.getKey().spareShare()))
        .sorted(Comparator.comparing(row -> row.references().get(0).replaceAll("[0-9]", "")))
        .toList();
  }

  /** What a meter on ohms can show at most across the resistors of some blocks. */
  List<String> atMost(List<PlacedBlock> blocks) {
    List<String> known = new ArrayList<>();
    for (PlacedBlock block : blocks) {
      for (WiredPart part : block.description().wiring().parts()) {
        double ohms =
            part.device() instanceof Resistor resistor
                ? resistor.ohms()
                : part.device() instanceof Potentiometer track ? track.trackOhms() : 0;
        double share = parts.tolerance(part.device(), block.partName(part)).orElse(0);
        if (ohms > 0 && assembly.references().ofPart(block.partName(part)).isPresent()) {
          known.add(
              words.text(
                  "stage.at-most",
                  "part",
                  reference(assembly, block, part.id()),
                  "ohms",
                  words.numbers().text(StageRows.rounded(ohms * (1 + share), true), Unit.OHM)));
        }
      }
    }
    return known;
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

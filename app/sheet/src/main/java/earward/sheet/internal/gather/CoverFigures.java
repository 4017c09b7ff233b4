package earward.sheet.internal.gather;

import earward.block.Conditions;
import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.Amount;
import earward.sheet.content.KeyFigure;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** What the cover says: under which conditions, and what the kit does. */
final class CoverFigures {
  /** The state in which people usually listen: the listening level of the wishes. */
  static final CaseName LISTENING = new CaseName("listening");

  private static final String PATH = "path";

  private final Assembly assembly;
  private final Figures figures;
  private final BlockNames names;
  private final Words words;

  CoverFigures(Assembly assembly, Figures figures, BlockNames names, Words words) {
    this.assembly = assembly;
    this.figures = figures;
    this.names = names;
    this.words = words;
  }

  String introduction() {
    String path = assembly.path().stream().map(names::of).collect(Collectors.joining(" → "));
    String beside = assembly.beside().stream().map(names::of).collect(Collectors.joining(", "));
    String carrier = words.numbers().text(core().carrierHertz(), Unit.HERTZ);
    String first =
        words.text("introduction.path", "carrier", carrier, "path", path.isEmpty() ? "–" : path);
    return beside.isEmpty()
        ? first
        : first + " " + words.text("introduction.beside", "blocks", beside);
  }

  private Conditions core() {
    return assembly.design().conditions().core();
  }

  List<KeyFigure> conditions() {
    Conditions core = core();
    List<KeyFigure> rows = new ArrayList<>();
    rows.add(amount("conditions.carrier", core.carrierHertz(), Unit.HERTZ));
    rows.add(amount("conditions.weak", core.weakPeakVolts(), Unit.VOLT));
    rows.add(amount("conditions.test", core.testPeakVolts(), Unit.VOLT));
    rows.add(amount("conditions.strong", core.strongPeakVolts(), Unit.VOLT));
    rows.add(depth("conditions.modulation", "depth-at", core.testDepth(), core.toneHertz()));
    rows.add(
        depth("conditions.deepest", "depth-up-to", core.deepestDepth(), core.highestToneHertz()));
    rows.add(
        new KeyFigure(
            words.text("conditions.ambient"),
            List.of(
                new Amount(core.ambientCelsius(), Unit.CELSIUS),
                new Amount(core.highestAmbientCelsius(), Unit.CELSIUS)),
            ""));
    rows.addAll(supplies());
    String frontEnd =
        assembly.design().conditions().frontEndSupply().name().toLowerCase(Locale.ROOT);
    rows.add(
        KeyFigure.words(
            words.text("conditions.front-end"),
            words.text("front-end." + frontEnd.replace('_', '-'))));
    rows.addAll(knobs());
    return rows;
  }

  private KeyFigure amount(String key, double si, Unit unit) {
    return KeyFigure.of(words.text(key), new Amount(si, unit), "");
  }

  private KeyFigure depth(String label, String key, double depth, double hertz) {
    return KeyFigure.words(
        words.text(label),
        words.text(
            "conditions." + key,
            "depth",
            words.numbers().text(depth, Unit.FRACTION),
            "tone",
            words.numbers().text(hertz, Unit.HERTZ)));
  }

  private List<KeyFigure> supplies() {
    List<KeyFigure> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.beside()) {
      for (WiredPart part : block.description().wiring().parts()) {
        if (part.device() instanceof Battery battery) {
          rows.add(
              new KeyFigure(
                  battery.model().name(),
                  List.of(
                      new Amount(battery.model().newVolts(), Unit.VOLT),
                      new Amount(battery.model().endVolts(), Unit.VOLT)),
                  words.text("conditions.new-to-end")));
        } else if (part.device() instanceof Adaptor adaptor) {
          Amount volts = new Amount(adaptor.model().ratedVolts(), Unit.VOLT);
          rows.add(KeyFigure.of(adaptor.model().name(), volts, ""));
        }
      }
    }
    return rows;
  }

  private List<KeyFigure> knobs() {
    List<KeyFigure> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (Setting setting : block.type().settings()) {
        if (setting instanceof Setting.Position position
            && block.description().wiring().part(position.partId()).isPresent()) {
          double turn = block.values().position(position.id());
          rows.add(
              KeyFigure.of(
                  names.setting(block, position.id()),
                  new Amount(turn, Unit.FRACTION),
                  words.text("conditions.of-the-turn")));
        }
      }
    }
    return rows;
  }

  List<KeyFigure> keyFigures() {
    List<KeyFigure> rows = new ArrayList<>();
    add(rows, "figures.clip", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT);
    add(rows, "figures.ten-percent", Quantity.TEN_PERCENT_WATTS, CaseName.FULL_OUTPUT);
    if (onBattery()) {
      add(rows, "figures.clip-low", Quantity.CLIP_WATTS, CaseName.BATTERY_LOW);
    }
    sound(rows);
    add(rows, "figures.test-output", Quantity.OUTPUT_WATTS, CaseName.TEST);
    add(rows, "figures.distortion", Quantity.DISTORTION, CaseName.TEST);
    band(rows);
    add(rows, "figures.clean-depth", Quantity.CLEAN_DEPTH, CaseName.TEST);
    worstTurn(rows);
    add(rows, "figures.clipping-depth", Quantity.CLIPPING_DEPTH, CaseName.DEEPEST);
    add(rows, "figures.headroom", Quantity.HEADROOM_DECIBELS, CaseName.TEST);
    noise(rows);
    add(rows, "figures.hum", Quantity.SIGNAL_TO_HUM_DECIBELS, CaseName.TEST);
    loop(rows);
    add(rows, "figures.current", Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL);
    life(rows);
    if (rows.isEmpty()) {
      rows.add(KeyFigure.words(words.text("figures.none"), words.text("figures.not-solved")));
    }
    return rows;
  }

  private boolean onBattery() {
    return assembly.beside().stream()
        .anyMatch(block -> !block.description().wiring().partsOf(Battery.class).isEmpty());
  }

  private void add(List<KeyFigure> rows, String key, Quantity quantity, CaseName caseName) {
    OptionalDouble figure = figures.find(PATH, quantity, caseName);
    if (figure.isPresent()) {
      rows.add(amount(key, figure.getAsDouble(), quantity.unit()));
    }
  }

  private void band(List<KeyFigure> rows) {
    OptionalDouble low = figures.find(PATH, Quantity.LOW_EDGE_HERTZ, CaseName.TEST);
    OptionalDouble high = figures.find(PATH, Quantity.HIGH_EDGE_HERTZ, CaseName.TEST);
    if (low.isPresent() && high.isPresent()) {
      rows.add(
          new KeyFigure(
              words.text("figures.band"),
              List.of(Amount.of(low, Unit.HERTZ), Amount.of(high, Unit.HERTZ)),
              ""));
    }
  }

  /** Only where the turn of a knob makes a difference. */
  private void worstTurn(List<KeyFigure> rows) {
    boolean turned =
        figures.all().keySet().stream()
            .anyMatch(
                name ->
                    name.quantity() == Quantity.KNOB_POSITION
                        && name.caseName().equals(CaseName.WORST_TURN));
    if (turned) {
      add(rows, "figures.clean-depth-turn", Quantity.CLEAN_DEPTH, CaseName.WORST_TURN);
    }
  }

  /** Only where the loop through the supply could sustain itself at all. */
  private void loop(List<KeyFigure> rows) {
    OptionalDouble margin =
        figures.find(PATH, Quantity.RAIL_LOOP_MARGIN_DECIBELS, CaseName.BATTERY_LOW);
    if (margin.isPresent() && Double.isFinite(margin.getAsDouble())) {
      rows.add(amount("figures.rail-loop", margin.getAsDouble(), Unit.DECIBEL));
    }
  }

  private void sound(List<KeyFigure> rows) {
    OptionalDouble level = figures.find(PATH, Quantity.SOUND_DECIBELS, CaseName.FULL_OUTPUT);
    if (level.isPresent()) {
      double metres = assembly.design().conditions().wanted().listeningMetres();
      String label =
          words.text("figures.sound", "metres", words.numbers().text(metres, Unit.NUMBER));
      rows.add(KeyFigure.of(label, Amount.of(level, Unit.DECIBEL), ""));
    }
  }

  private void noise(List<KeyFigure> rows) {
    OptionalDouble flat = figures.find(PATH, Quantity.SIGNAL_TO_NOISE_DECIBELS, CaseName.TEST);
    if (flat.isPresent()) {
      String label =
          words.text(
              "figures.noise",
              "low",
              words.numbers().text(core().lowestToneHertz(), Unit.HERTZ),
              "high",
              words.numbers().text(core().highestToneHertz(), Unit.HERTZ));
      rows.add(KeyFigure.of(label, Amount.of(flat, Unit.DECIBEL), ""));
    }
  }

  private void life(List<KeyFigure> rows) {
    OptionalDouble hours = figures.find(PATH, Quantity.BATTERY_HOURS, LISTENING);
    if (hours.isPresent() && Double.isFinite(hours.getAsDouble())) {
      double watts = assembly.design().conditions().wanted().listeningWatts();
      String label = words.text("figures.life", "watts", words.numbers().text(watts, Unit.WATT));
      rows.add(KeyFigure.of(label, Amount.of(hours, Unit.HOUR), ""));
    }
  }

  /** How the readings are to be taken. */
  List<String> method() {
    Conditions core = core();
    String knobs =
        knobs().stream()
            .map(knob -> knob.label() + " " + words.numbers().write(knob.amounts().get(0)).whole())
            .collect(Collectors.joining(", "));
    String signal =
        words.text(
            "method.signal",
            "carrier",
            words.numbers().text(core.carrierHertz(), Unit.HERTZ),
            "peak",
            words.numbers().text(core.testPeakVolts(), Unit.VOLT),
            "depth",
            words.numbers().text(core.testDepth(), Unit.FRACTION),
            "tone",
            words.numbers().text(core.toneHertz(), Unit.HERTZ));
    String knobWords = knobs.isEmpty() ? "" : " " + words.text("method.knobs", "knobs", knobs);
    return List.of(words.text("method.leads") + " " + signal + knobWords);
  }
}

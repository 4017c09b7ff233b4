package earward.sheet.internal.gather;

import earward.block.Role;
import earward.block.device.Battery;
import earward.block.device.Loudspeaker;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.Caution;
import earward.block.wiring.PartCaution;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.CautionRow;
import earward.sheet.content.CautionRow.Signal;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * The cautions that apply: those of every kit, and those that parts of this one carry. A hazard
 * that several parts carry is told once, with their references.
 */
final class CautionRows {
  /**
   * A surface that may be held for longer than a minute, °C.
   *
   * <p>Source: IEC 62368-1 table 38, contact of more than one minute (from memory).
   */
  private static final double HELD_CELSIUS = 48;

  /** Hazards that a part reminds of, but that are not at the part. */
  private static final Set<Caution> OF_THE_WHOLE_SET =
      Set.of(Caution.OUTDOOR_AERIAL, Caution.HEARING);

  private final Assembly assembly;
  private final Figures figures;
  private final Words words;

  CautionRows(Assembly assembly, Figures figures, Words words) {
    this.assembly = assembly;
    this.figures = figures;
    this.words = words;
  }

  List<CautionRow> rows() {
    List<CautionRow> rows = new ArrayList<>();
    rows.add(general(Signal.WARNING, "mains"));
    Map<Caution, List<String>> carried = carried();
    carried.forEach(
        (caution, references) ->
            rows.add(row(caution, OF_THE_WHOLE_SET.contains(caution) ? List.of() : references)));
    rows.add(general(Signal.CAUTION, "soldering"));
    if (loud() && !carried.containsKey(Caution.HEARING)) {
      rows.add(row(Caution.HEARING, List.of()));
    }
    if (!carried.containsKey(Caution.OUTDOOR_AERIAL)) {
      rows.add(row(Caution.OUTDOOR_AERIAL, List.of()));
    }
    // long ones together, so that two side by side are of one height
    rows.sort(
        Comparator.comparing(CautionRow::signal).thenComparing(row -> -row.sentence().length()));
    return rows;
  }

  /** Those of some of the parts, each with these parts only. */
  List<CautionRow> of(Set<String> references) {
    List<CautionRow> rows = new ArrayList<>();
    for (CautionRow row : rows()) {
      List<String> own = row.references().stream().filter(references::contains).toList();
      if (!own.isEmpty()) {
        rows.add(new CautionRow(row.signal(), row.headline(), row.sentence(), own));
      }
    }
    return rows;
  }

  private boolean loud() {
    return assembly.blocks().stream()
        .anyMatch(
            block ->
                block.type().role() == Role.POWER
                    || !block.description().wiring().partsOf(Loudspeaker.class).isEmpty());
  }

  private Map<Caution, List<String>> carried() {
    Map<Caution, List<String>> carried = new EnumMap<>(Caution.class);
    for (PlacedBlock block : assembly.blocks()) {
      for (PartCaution caution : block.description().wiring().cautions()) {
        if (applies(block, caution)) {
          String reference = PartRows.reference(assembly, block, caution.partId());
          List<String> references =
              carried.computeIfAbsent(caution.caution(), any -> new ArrayList<>());
          if (!references.contains(reference)) {
            references.add(reference);
          }
        }
      }
    }
    return carried;
  }

  private boolean applies(PlacedBlock block, PartCaution caution) {
    return switch (caution.caution()) {
      case HOT_PART ->
          surface(block.partName(caution.partId())).orElse(HELD_CELSIUS) >= HELD_CELSIUS;
      case BATTERY_SHORT, LITHIUM_IN_HOLDER ->
          block
              .description()
              .wiring()
              .part(caution.partId())
              .filter(part -> part.device() instanceof Battery)
              .isPresent();
      default -> true;
    };
  }

  private OptionalDouble surface(String partName) {
    return figures.find(partName, Quantity.SURFACE_CELSIUS, CaseName.HOTTEST);
  }

  private CautionRow row(Caution caution, List<String> references) {
    String key = "caution." + caution.name().toLowerCase(Locale.ROOT).replace('_', '-');
    String sentence = words.text(key + ".do");
    if (caution == Caution.HOT_PART) {
      sentence += hottest();
    }
    return new CautionRow(signal(caution), words.text(key), sentence, references);
  }

  private String hottest() {
    double most = Double.NaN;
    for (PlacedBlock block : assembly.blocks()) {
      for (PartCaution caution : block.description().wiring().cautions()) {
        double surface = surface(block.partName(caution.partId())).orElse(Double.NaN);
        most =
            Double.isNaN(most) ? surface : Math.max(most, Double.isNaN(surface) ? most : surface);
      }
    }
    return Double.isNaN(most)
        ? ""
        : " "
            + words.text(
                "caution.hot-part.most", "celsius", words.numbers().text(most, Unit.CELSIUS));
  }

  private CautionRow general(Signal signal, String name) {
    String key = "caution." + name;
    return new CautionRow(signal, words.text(key), words.text(key + ".do"), List.of());
  }

  private static Signal signal(Caution caution) {
    return switch (caution) {
      case LITHIUM_IN_HOLDER, BATTERY_SHORT, OUTDOOR_AERIAL -> Signal.WARNING;
      case HOT_PART, POLARITY, CAPACITOR_DISCHARGE, HEARING -> Signal.CAUTION;
      case ADAPTOR_VOLTAGE, BRIDGE_NEVER_TO_GROUND, GLASS_DIODE, GERMANIUM_HEAT, STATIC_DISCHARGE ->
          Signal.NOTICE;
    };
  }
}

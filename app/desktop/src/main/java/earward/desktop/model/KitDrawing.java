package earward.desktop.model;

import earward.block.wiring.TestPoint;
import earward.block.wiring.WiredPart;
import earward.drawing.LayoutOptions;
import earward.drawing.LayoutWords;
import earward.drawing.PartLabel;
import earward.drawing.Schematic;
import earward.drawing.Schematics;
import earward.drawing.SheetBlock;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.Sheets;
import java.awt.Font;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The drawing of a kit or of one block, laid out for the screen.
 *
 * @param schematic the geometry
 * @param flags the place in figures of each test point's flag
 * @param references what is written on each flag, without a value
 */
public record KitDrawing(
    Schematic schematic, Map<String, String> flags, Map<String, String> references) {
  private static final double TEXT_POINTS = 8;

  /** What a flag keeps room for: a reading with a sign and three digits. */
  private static final String WIDEST = "  \u2212888\u202fmV";

  public KitDrawing {
    flags = Map.copyOf(flags);
    references = Map.copyOf(references);
  }

  /**
   * Lays out the drawing; off the event thread.
   *
   * @param only the block that is drawn alone; empty for all of it
   * @param widthPoints at which rows break
   * @param values whether the flags keep room for live values
   */
  public static KitDrawing of(
      Assembly assembly, String only, double widthPoints, Font font, boolean values) {
    LayoutOptions options =
        new LayoutOptions(
            Math.max(120, widthPoints),
            TEXT_POINTS,
            font,
            new LayoutWords(Words.of("drawing.to"), Words.of("drawing.from")));
    Map<String, String> flags = new LinkedHashMap<>();
    Map<String, String> references = new LinkedHashMap<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (TestPoint point : block.description().wiring().testPoints()) {
        String place = block.id() + "." + point.id();
        String key = block.id() + "#" + point.id();
        flags.put(key, place);
        references.put(key, assembly.references().ofTestPoint(place).orElse(point.id()));
      }
    }
    List<SheetBlock> path = blocks(assembly, assembly.path(), only, references, values);
    List<SheetBlock> beside = blocks(assembly, assembly.beside(), only, references, values);
    Schematic schematic =
        path.isEmpty()
            ? Schematics.lay(beside, List.of(), options)
            : Schematics.lay(path, beside, options);
    return new KitDrawing(schematic, flags, references);
  }

  private static List<SheetBlock> blocks(
      Assembly assembly,
      List<PlacedBlock> placed,
      String only,
      Map<String, String> references,
      boolean values) {
    return placed.stream()
        .filter(block -> only.isEmpty() || block.id().equals(only))
        .map(block -> block(assembly, block, references, values))
        .toList();
  }

  private static SheetBlock block(
      Assembly assembly, PlacedBlock block, Map<String, String> references, boolean values) {
    Map<String, PartLabel> labels = new HashMap<>();
    for (WiredPart part : block.description().wiring().parts()) {
      String reference = assembly.references().ofPart(block.partName(part)).orElse("");
      labels.put(part.id(), new PartLabel(reference, Sheets.partValue(part.device(), "en")));
    }
    Map<String, String> texts = new HashMap<>();
    for (TestPoint point : block.description().wiring().testPoints()) {
      String reference = references.getOrDefault(block.id() + "#" + point.id(), point.id());
      texts.put(point.id(), values ? reference + WIDEST : reference);
    }
    return new SheetBlock(
        block.id(),
        Texts.of(block.type()).get("name"),
        block.description().wiring(),
        block.globalNodes(),
        labels,
        texts);
  }

  /** The drawing with values on its flags. */
  public Schematic with(Map<String, String> valueByPlace) {
    Map<String, String> texts = new HashMap<>();
    references.forEach(
        (key, reference) -> {
          String value = valueByPlace.getOrDefault(flags.getOrDefault(key, ""), "");
          texts.put(key, value.isEmpty() ? reference : reference + "  " + value);
        });
    return schematic.withFlagTexts(texts);
  }
}

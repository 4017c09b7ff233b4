package earward.sheet.internal.gather;

import earward.block.wiring.TestPoint;
import earward.block.wiring.WiredPart;
import earward.drawing.Ink;
import earward.drawing.LayoutOptions;
import earward.drawing.LayoutWords;
import earward.drawing.PartLabel;
import earward.drawing.Schematic;
import earward.drawing.Schematics;
import earward.drawing.SheetBlock;
import earward.kit.design.SheetOptions.Density;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.sheet.content.PathDrawing;
import earward.sheet.internal.page.Sheet;
import earward.sheet.internal.page.Typeface;
import earward.sheet.internal.section.SideBySide;
import earward.sheet.internal.section.Words;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The drawing of the path, laid for the paper of the sheet. */
final class Drawn {
  private static final double ROOMY_TEXT = 8;

  /** What heading and note take on the drawing's page. */
  private static final double ROOM = 70;

  private final Assembly assembly;
  private final BlockNames names;
  private final PartRows parts;
  private final Words words;

  Drawn(Assembly assembly, BlockNames names, PartRows parts, Words words) {
    this.assembly = assembly;
    this.names = names;
    this.parts = parts;
    this.words = words;
  }

  PathDrawing drawing() {
    return drawing(assembly.path(), assembly.beside(), paper().contentWidth());
  }

  /** The drawing of some blocks that follow each other, and of some beside them. */
  PathDrawing drawing(List<PlacedBlock> path, List<PlacedBlock> beside, double width) {
    if (path.isEmpty()) {
      return PathDrawing.none();
    }
    boolean roomy = assembly.design().sheet().density() == Density.ROOMY;
    LayoutOptions options =
        new LayoutOptions(
            width,
            roomy ? ROOMY_TEXT : LayoutOptions.LEAST_TEXT_POINTS,
            Typeface.forDrawings(),
            new LayoutWords(words.text("drawing.to"), words.text("drawing.from")));
    Schematic schematic = Schematics.lay(blocks(path), blocks(beside), options);
    if (!(schematic.height() > 0)) {
      return PathDrawing.none();
    }
    boolean onOnePage = schematic.height() <= paper().contentHeight() - ROOM;
    return new PathDrawing(
        onOnePage ? List.of(row(schematic, 0, schematic.height())) : rows(schematic));
  }

  /** The drawing of a stage: beside the list of its parts where it is small enough for that. */
  PathDrawing stage(List<PlacedBlock> path, List<PlacedBlock> beside, boolean large) {
    float half = SideBySide.half(paper().contentWidth());
    PathDrawing small = large ? PathDrawing.none() : drawing(path, beside, half);
    boolean fits = small.rows().size() == 1 && small.rows().get(0).widthPoints() <= half + 0.5;
    return fits ? small : drawing(path, beside, paper().contentWidth());
  }

  private Sheet paper() {
    return Sheet.of(assembly.design().sheet().paper());
  }

  /** Row by row, broken in the middle of what is between them. */
  private static List<PathDrawing.Row> rows(Schematic schematic) {
    List<Rectangle2D> boxes = schematic.rows();
    List<PathDrawing.Row> rows = new ArrayList<>();
    double top = 0;
    for (int i = 0; i < boxes.size(); i++) {
      boolean last = i == boxes.size() - 1;
      double bottom =
          last ? schematic.height() : (boxes.get(i).getMaxY() + boxes.get(i + 1).getMinY()) / 2;
      rows.add(row(schematic, top, bottom));
      top = bottom;
    }
    return rows;
  }

  private static PathDrawing.Row row(Schematic schematic, double top, double bottom) {
    return new PathDrawing.Row(
        schematic.width(),
        bottom - top,
        graphics -> schematic.paint(graphics, Ink.print(), top, bottom));
  }

  private List<SheetBlock> blocks(List<PlacedBlock> placed) {
    return placed.stream().map(this::block).toList();
  }

  private SheetBlock block(PlacedBlock block) {
    Map<String, PartLabel> labels = new HashMap<>();
    for (WiredPart part : block.description().wiring().parts()) {
      String reference = assembly.references().ofPart(block.partName(part)).orElse("");
      labels.put(part.id(), new PartLabel(reference, parts.value(part.device())));
    }
    Map<String, String> flags = new HashMap<>();
    for (TestPoint point : block.description().wiring().testPoints()) {
      assembly
          .references()
          .ofTestPoint(block.id() + "." + point.id())
          .ifPresent(flag -> flags.put(point.id(), flag));
    }
    return new SheetBlock(
        block.id(),
        names.of(block),
        block.description().wiring(),
        block.globalNodes(),
        labels,
        flags);
  }
}

package earward.drawing;

import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;

/** Paints the examples to PNG files in the target folder, to be looked at. */
final class Gallery {
  private static final double ZOOM = 2.2;
  private static final int WARM_RUNS = 3;

  private Gallery() {}

  /** Paints them all; the folder may be named. */
  public static void main(String[] arguments) throws IOException {
    Path folder = Path.of(arguments.length > 0 ? arguments[0] : "target/gallery");
    Files.createDirectories(folder);
    for (DrawingRuleTest.Case drawn : Examples.cases()) {
      show(folder, drawn.name(), drawn.path(), drawn.beside());
    }
  }

  private static void show(Path folder, String name, List<SheetBlock> path, List<SheetBlock> beside)
      throws IOException {
    LayoutOptions options = LayoutOptions.usual(Examples.font());
    for (int warm = 0; warm < WARM_RUNS; warm++) {
      Schematics.lay(path, beside, options);
    }
    long start = System.nanoTime();
    Schematic drawn = Schematics.lay(path, beside, options);
    System.out.printf(
        "%s: %.0f x %.0f pt, %d ms%n",
        name, drawn.width(), drawn.height(), (System.nanoTime() - start) / 1_000_000);
    DrawingRule.broken(path, beside, options).forEach(line -> System.out.println("  " + line));
    paint(drawn, Ink.print(), folder.resolve(name + ".png").toFile());
    if (name.equals("lantern")) {
      paint(drawn, Ink.dark(), folder.resolve(name + "-dark.png").toFile());
    }
  }

  private static void paint(Schematic drawn, Ink ink, File file) throws IOException {
    int margin = 10;
    BufferedImage image =
        new BufferedImage(
            (int) (ZOOM * (drawn.width() + 2 * margin)),
            (int) (ZOOM * (drawn.height() + 2 * margin)),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.setColor(ink.paper());
    graphics.fillRect(0, 0, image.getWidth(), image.getHeight());
    graphics.scale(ZOOM, ZOOM);
    graphics.translate(margin, margin);
    drawn.paint(graphics, ink);
    graphics.dispose();
    ImageIO.write(image, "png", file);
  }
}

package earward.desktop.view;

import earward.block.figure.FigureName;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.drawing.Ink;
import earward.drawing.Schematic;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.RenderingHints;
import java.awt.Toolkit;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.awt.image.BufferedImage;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Copies figures, curves and the drawing to the clipboard. */
final class CopyActions {
  private static final double SHARPNESS = 3;

  private final Workbench workbench;
  private final DesignDesk desk;

  CopyActions(Workbench workbench, DesignDesk desk) {
    this.workbench = workbench;
    this.desk = desk;
  }

  /** All figures, one a line: name, value in SI units. */
  void figures() {
    StringBuilder text = new StringBuilder();
    workbench
        .kit()
        .ifPresent(
            kit -> {
              for (Map.Entry<FigureName, Double> figure : kit.figures().all().entrySet()) {
                text.append(figure.getKey())
                    .append('\t')
                    .append(figure.getValue())
                    .append('\t')
                    .append(figure.getKey().quantity().unit().symbol())
                    .append('\n');
              }
            });
    if (text.length() == 0) {
      workbench.say(Words.of("nothing.solved"));
      return;
    }
    put(new StringSelection(text.toString()), "copied.figures");
  }

  void drawing() {
    Schematic schematic = desk.drawing().pane().schematic().orElse(null);
    if (schematic == null) {
      workbench.say(Words.of("drawing.none"));
      return;
    }
    BufferedImage image =
        new BufferedImage(
            (int) Math.ceil(schematic.width() * SHARPNESS),
            (int) Math.ceil(schematic.height() * SHARPNESS),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setColor(Ink.print().paper());
    g.fillRect(0, 0, image.getWidth(), image.getHeight());
    g.scale(SHARPNESS, SHARPNESS);
    schematic.paint(g, Ink.print());
    g.dispose();
    put(new Picture(image), "copied.drawing");
  }

  void curve() {
    if (!desk.curvesOpen() || desk.curves().pane().plot() == null) {
      workbench.say(Words.of("curves.none"));
      return;
    }
    put(new Picture(desk.curves().pane().image()), "copied.curve");
  }

  private void put(Transferable what, String key) {
    try {
      Toolkit.getDefaultToolkit().getSystemClipboard().setContents(what, null);
      workbench.say(Words.of(key));
    } catch (IllegalStateException e) {
      workbench.say(Words.of("copied.not"));
    }
  }

  /** A picture for the clipboard. */
  private static final class Picture implements Transferable {
    private final Image image;

    Picture(Image image) {
      this.image = image;
    }

    @Override
    public DataFlavor[] getTransferDataFlavors() {
      return new DataFlavor[] {DataFlavor.imageFlavor};
    }

    @Override
    public boolean isDataFlavorSupported(@Nullable DataFlavor flavor) {
      return DataFlavor.imageFlavor.equals(flavor);
    }

    @Override
    public Object getTransferData(DataFlavor flavor) throws UnsupportedFlavorException {
      if (!isDataFlavorSupported(flavor)) {
        throw new UnsupportedFlavorException(flavor);
      }
      return image;
    }
  }
}

package earward.desktop.view;

import earward.desktop.model.Background;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.review.ReviewedKit;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.ImageIcon;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import net.miginfocom.swing.MigLayout;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.jspecify.annotations.Nullable;

/** The real pages of the build sheet, made anew when the desk is looked at. */
final class SheetDesk extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final float DOTS_PER_INCH = 110;

  private final transient Workbench workbench;
  private final transient Background background;
  private final JPanel pages = new JPanel(new MigLayout("insets 16, fillx, wrap 1", "[center]"));
  private transient @Nullable ReviewedKit shown;

  SheetDesk(Workbench workbench, Background background) {
    super(new MigLayout("insets 0, fill", "[fill]", "[fill]"));
    this.workbench = workbench;
    this.background = background;
    setName("sheet");
    getAccessibleContext().setAccessibleName(Words.of("sheet.name"));
    JScrollPane scroll = new JScrollPane(pages);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(32);
    add(scroll, "grow, push");
  }

  /** Makes the pages of the present review, if they are looked at and not made yet. */
  void refresh() {
    Optional<ReviewedKit> kit = workbench.kit();
    if (!isShowing() || workbench.busy() || kit.isEmpty() || kit.get().equals(shown)) {
      return;
    }
    ReviewedKit mine = kit.get();
    shown = mine;
    background.start(this::images, this::show, this::fail);
  }

  private List<BufferedImage> images() throws IOException {
    List<BufferedImage> images = new ArrayList<>();
    Optional<byte[]> bytes = workbench.sheet();
    if (bytes.isPresent()) {
      try (PDDocument document = Loader.loadPDF(bytes.get())) {
        PDFRenderer renderer = new PDFRenderer(document);
        for (int page = 0; page < document.getNumberOfPages(); page++) {
          images.add(renderer.renderImageWithDPI(page, DOTS_PER_INCH));
        }
      }
    }
    return images;
  }

  private void show(List<BufferedImage> images) {
    pages.removeAll();
    for (int i = 0; i < images.size(); i++) {
      JLabel page = new JLabel(new ImageIcon(images.get(i)));
      page.getAccessibleContext().setAccessibleName(Words.of("sheet.page", i + 1, images.size()));
      pages.add(page, "gapbottom 12");
    }
    pages.revalidate();
    pages.repaint();
  }

  private void fail(Exception fault) {
    pages.removeAll();
    pages.add(new JLabel(Words.of("sheet.failed", String.valueOf(fault.getMessage()))));
    pages.revalidate();
  }
}

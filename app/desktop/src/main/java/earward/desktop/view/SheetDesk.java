package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.Selection;
import earward.desktop.model.SheetPages;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.review.ReviewedKit;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
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
  private static final int DOTS_PER_INCH = 144;
  private static final int PAGE_WIDTH = 660;

  private final transient Workbench workbench;
  private final JPanel pages = new JPanel(new MigLayout("insets 16, fillx, wrap 1", "[center]"));
  private final JLabel state = new QuietLabel("");
  private transient @Nullable ReviewedKit shown;

  SheetDesk(Workbench workbench, Runnable export, Runnable print) {
    super(new MigLayout("insets 0, fill, wrap 1", "[fill]", "[][grow,fill]"));
    this.workbench = workbench;
    setName("sheet");
    getAccessibleContext().setAccessibleName(Words.of("sheet.name"));
    JPanel bar = new JPanel(new MigLayout("insets 4 10 4 10, gapx 6, fillx", "", "[]"));
    bar.add(button("sheet.export", export));
    bar.add(button("sheet.print", print));
    bar.add(button("sheet.options", () -> workbench.select(Selection.SHEET)));
    bar.add(state, "push, alignx right");
    JScrollPane scroll = new JScrollPane(pages);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(40);
    add(bar);
    add(scroll, "grow, push");
  }

  private static JButton button(String key, Runnable run) {
    JButton button = new JButton(Words.of(key));
    button.setName(key);
    button.addActionListener(e -> run.run());
    return button;
  }

  /** Makes the pages of the present review, if they are looked at and not made yet. */
  void refresh() {
    Optional<ReviewedKit> kit = workbench.kit();
    if (!isShowing() || kit.isEmpty()) {
      return;
    }
    if (workbench.busy()) {
      state.setText(Words.of("sheet.former"));
      return;
    }
    if (kit.get().equals(shown)) {
      return;
    }
    ReviewedKit mine = kit.get();
    shown = mine;
    state.setText(Words.of("sheet.making"));
    workbench
        .lanes()
        .pages()
        .start(
            () -> images(mine),
            images -> {
              if (mine.equals(shown)) {
                show(images);
              }
            },
            this::fail);
  }

  private static List<BufferedImage> images(ReviewedKit kit) throws IOException {
    List<BufferedImage> images = new ArrayList<>();
    try (PDDocument document = Loader.loadPDF(SheetPages.pdf(kit))) {
      PDFRenderer renderer = new PDFRenderer(document);
      for (int page = 0; page < document.getNumberOfPages(); page++) {
        images.add(renderer.renderImageWithDPI(page, DOTS_PER_INCH));
      }
    }
    return images;
  }

  private void show(List<BufferedImage> images) {
    pages.removeAll();
    for (int i = 0; i < images.size(); i++) {
      Page page = new Page(images.get(i), Words.of("sheet.page", i + 1, images.size()));
      pages.add(page, "gapbottom 12");
    }
    state.setText(Words.of("sheet.pages", images.size()));
    pages.revalidate();
    pages.repaint();
  }

  private void fail(Exception fault) {
    pages.removeAll();
    state.setText("");
    pages.add(new JLabel(Words.of("sheet.failed", String.valueOf(fault.getMessage()))));
    pages.revalidate();
  }

  /** One page, sharp on a screen of twice the density too. */
  private static final class Page extends JPanel {
    private static final long serialVersionUID = 1L;
    private final transient BufferedImage image;

    Page(BufferedImage image, String name) {
      this.image = image;
      setName("page");
      setFocusable(true);
      getAccessibleContext().setAccessibleName(name);
      setBorder(BorderFactory.createLineBorder(Look.line()));
    }

    @Override
    public Dimension getPreferredSize() {
      int width = UIScale.scale(PAGE_WIDTH);
      return new Dimension(width, width * image.getHeight() / image.getWidth());
    }

    @Override
    protected void paintComponent(Graphics graphics) {
      Graphics2D g = (Graphics2D) graphics.create();
      g.setRenderingHint(
          RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BICUBIC);
      g.setRenderingHint(RenderingHints.KEY_RENDERING, RenderingHints.VALUE_RENDER_QUALITY);
      g.drawImage(image, 0, 0, getWidth(), getHeight(), null);
      g.dispose();
    }
  }
}

package earward.desktop.view;

import earward.desktop.model.KitDrawing;
import earward.desktop.model.Lanes;
import earward.desktop.model.Recovery;
import earward.desktop.model.StarterKit;
import earward.desktop.model.Words;
import earward.desktop.model.Workshop;
import earward.kit.path.Assembler;
import java.awt.Font;
import java.nio.file.Path;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingConstants;
import javax.swing.UIManager;
import net.miginfocom.swing.MigLayout;

/** Where a sitting begins: an empty path, a starter kit, what was open before, what was left. */
final class StartPage extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final double DRAWING_WIDTH = 900;

  private final transient Documents documents;
  private final JButton empty = new JButton(Words.of("start.empty"));

  StartPage(Workshop workshop, Lanes lanes, Documents documents) {
    super(new MigLayout("insets 0, fill", "[grow,fill]", "[grow,fill]"));
    this.documents = documents;
    setName("start");
    JPanel page =
        new JPanel(new MigLayout("insets 28 36 28 36, wrap 1, gapy 8", "[grow,fill]", ""));
    JLabel title = new JLabel(Words.of("start.title"));
    title.putClientProperty("FlatLaf.styleClass", "h1");
    page.add(title);
    JLabel says = new QuietLabel(Html.wrapped(Words.of("start.says"), 720));
    page.add(says);
    recovered(page);
    JPanel first = new JPanel(new MigLayout("insets 0, gapx 10, novisualpadding", "", "[]"));
    empty.setName("start-empty");
    empty.putClientProperty("FlatLaf.styleClass", "large");
    empty.addActionListener(e -> documents.startEmpty());
    JButton open = new JButton(Words.of("start.open"));
    open.setName("start-open");
    open.putClientProperty("FlatLaf.styleClass", "large");
    open.addActionListener(e -> documents.openChosen());
    first.add(empty);
    first.add(open);
    page.add(first, "gaptop 10");
    kits(page, workshop, lanes);
    recent(page);
    refusals(page, workshop);
    JScrollPane scroll = new JScrollPane(page);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(30);
    add(scroll);
  }

  /** The first press of the page. */
  JButton first() {
    return empty;
  }

  private static void heading(JPanel page, String key) {
    JLabel label = new JLabel(Words.of(key));
    label.putClientProperty("FlatLaf.styleClass", "h3");
    page.add(label, "gaptop 16");
  }

  private void recovered(JPanel page) {
    List<Recovery.Left> left = documents.left();
    if (left.isEmpty()) {
      return;
    }
    heading(page, "start.recover");
    for (Recovery.Left one : left) {
      String of = one.original().map(path -> path.getFileName().toString()).orElse("–");
      JPanel row = new JPanel(new MigLayout("insets 0, gapx 8", "", "[]"));
      JButton take = new JButton(Words.of("start.recover.take", one.design().title(), of));
      take.setName("recover");
      JButton discard = new JButton(Words.of("start.recover.discard"));
      discard.setName("recover-discard");
      take.addActionListener(e -> documents.recover(one));
      discard.addActionListener(
          e -> {
            one.discard();
            row.setVisible(false);
          });
      row.add(take);
      row.add(discard);
      page.add(row);
    }
  }

  private void kits(JPanel page, Workshop workshop, Lanes lanes) {
    heading(page, "start.kits");
    JPanel row =
        new JPanel(new MigLayout("insets 0, gapx 14, gapy 14, wrap 3, novisualpadding", "", ""));
    Font font = UIManager.getFont("defaultFont").deriveFont(12f);
    for (StarterKit kit : StarterKit.all(workshop)) {
      DrawingCard card = new DrawingCard(kit.design().title(), kit.line());
      card.setName("kit-" + kit.design().title());
      card.addActionListener(e -> documents.startFrom(kit.design()));
      row.add(card);
      lanes
          .pages()
          .start(
              () ->
                  KitDrawing.of(
                          Assembler.assemble(kit.design(), workshop.types(), workshop.parts()),
                          "",
                          DRAWING_WIDTH,
                          font,
                          false)
                      .schematic(),
              card::show,
              fault -> {});
    }
    page.add(row);
  }

  private void recent(JPanel page) {
    List<Path> recent = documents.preferences().recent();
    if (recent.isEmpty()) {
      return;
    }
    heading(page, "start.recent");
    for (Path file : recent) {
      JButton button = new JButton(file.getFileName() + "   " + file.getParent());
      button.setName("recent");
      button.putClientProperty("JButton.buttonType", "borderless");
      button.setHorizontalAlignment(SwingConstants.LEADING);
      button.addActionListener(e -> documents.open(file));
      page.add(button, "growx 0, gapy 0");
    }
  }

  private static void refusals(JPanel page, Workshop workshop) {
    if (workshop.refusals().isEmpty()) {
      return;
    }
    heading(page, "start.refused");
    for (String sentence : workshop.refusals()) {
      page.add(new JLabel(Html.wrapped(sentence, 720)));
    }
  }
}

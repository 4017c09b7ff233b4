package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.LevelCard;
import earward.desktop.model.PathLevels;
import earward.desktop.model.SideCard;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import java.awt.event.ActionEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.List;
import javax.swing.AbstractAction;
import javax.swing.JPanel;
import javax.swing.KeyStroke;
import org.jspecify.annotations.Nullable;

/**
 * The path as level diagram: cards at the height of their level, seams as slopes between them, the
 * line above which the output clips. Supplies and take-offs stand at the right.
 */
final class LevelPath extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int CARD_HEIGHT = 46;
  private static final int MARGIN = 14;
  private static final int GAP = 22;
  private static final int SIDE_WIDTH = 124;
  private static final int MOST_CARD_WIDTH = 200;

  private final transient Workbench workbench;
  private transient List<LevelCard> cards = List.of();
  private transient List<SideCard> beside = List.of();
  private final transient List<Rectangle> places = new ArrayList<>();
  private final transient List<Rectangle> sidePlaces = new ArrayList<>();

  LevelPath(Workbench workbench) {
    this.workbench = workbench;
    setName("level-path");
    setFocusable(true);
    setToolTipText("");
    getAccessibleContext().setAccessibleName(Words.of("path.name"));
    getAccessibleContext().setAccessibleDescription(Words.of("path.help"));
    addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent e) {
            requestFocusInWindow();
            select(e);
          }
        });
    walk("LEFT", -1);
    walk("RIGHT", 1);
    addFocusListener(
        new java.awt.event.FocusAdapter() {
          @Override
          public void focusGained(java.awt.event.FocusEvent e) {
            repaint();
          }

          @Override
          public void focusLost(java.awt.event.FocusEvent e) {
            repaint();
          }
        });
  }

  private void walk(String key, int step) {
    getInputMap().put(KeyStroke.getKeyStroke(key), key);
    getActionMap()
        .put(
            key,
            new AbstractAction() {
              private static final long serialVersionUID = 1L;

              @Override
              public void actionPerformed(ActionEvent e) {
                List<String> ids = ids();
                int at = ids.indexOf(workbench.selected());
                if (!ids.isEmpty()) {
                  workbench.select(ids.get(Math.floorMod(at + step, ids.size())));
                }
              }
            });
  }

  private List<String> ids() {
    List<String> ids = new ArrayList<>();
    cards.forEach(card -> ids.add(card.id()));
    beside.forEach(card -> ids.add(card.id()));
    return ids;
  }

  private void select(MouseEvent e) {
    String hit = at(e);
    if (hit != null) {
      workbench.select(hit);
    }
  }

  private @Nullable String at(MouseEvent e) {
    for (int i = 0; i < places.size(); i++) {
      if (places.get(i).contains(e.getPoint())) {
        return cards.get(i).id();
      }
    }
    for (int i = 0; i < sidePlaces.size(); i++) {
      if (sidePlaces.get(i).contains(e.getPoint())) {
        return beside.get(i).id();
      }
    }
    return null;
  }

  @Override
  public @Nullable String getToolTipText(MouseEvent e) {
    for (int i = 0; i < places.size(); i++) {
      if (places.get(i).contains(e.getPoint())) {
        return describe(cards.get(i));
      }
    }
    return null;
  }

  private static String describe(LevelCard card) {
    return card.title() + ": " + level(card);
  }

  private static String level(LevelCard card) {
    return Words.of(card.carrier() ? "path.carrier" : "path.audio", card.level());
  }

  /** Takes over the present review. */
  void refresh() {
    workbench
        .kit()
        .ifPresent(
            kit -> {
              cards = PathLevels.of(kit);
              beside = PathLevels.beside(kit);
            });
    repaint();
  }

  @Override
  public Dimension getPreferredSize() {
    return UIScale.scale(new Dimension(760, 164));
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setColor(Look.ground());
    g.fillRect(0, 0, getWidth(), getHeight());
    g.setFont(getFont());
    place();
    paintSlopes(g);
    for (int i = 0; i < cards.size(); i++) {
      LevelCard card = cards.get(i);
      paintCard(g, places.get(i), card.id(), card.title(), level(card));
    }
    sayClipping(g);
    for (int i = 0; i < beside.size(); i++) {
      SideCard card = beside.get(i);
      paintCard(g, sidePlaces.get(i), card.id(), card.title(), card.says());
    }
    g.dispose();
  }

  private double lowest() {
    return cards.stream()
        .mapToDouble(LevelCard::decibelsVolt)
        .filter(Double::isFinite)
        .min()
        .orElse(-60);
  }

  private double highest() {
    double level =
        cards.stream()
            .mapToDouble(LevelCard::decibelsVolt)
            .filter(Double::isFinite)
            .max()
            .orElse(0);
    double clip =
        cards.stream()
            .mapToDouble(card -> card.decibelsVolt() + card.headroomDecibels())
            .filter(Double::isFinite)
            .max()
            .orElse(level);
    return Math.max(level, clip);
  }

  /** Height of a level: the card's middle. */
  private int y(double decibels) {
    double low = lowest() - 3;
    double high = highest() + 3;
    int half = UIScale.scale(CARD_HEIGHT / 2 + 20);
    int room = getHeight() - 2 * half;
    double known = Double.isFinite(decibels) ? decibels : low;
    return half + (int) Math.round((1 - (known - low) / (high - low)) * room);
  }

  private void place() {
    places.clear();
    sidePlaces.clear();
    int margin = UIScale.scale(MARGIN);
    int gap = UIScale.scale(GAP);
    int side = beside.isEmpty() ? 0 : UIScale.scale(SIDE_WIDTH) + 2 * margin;
    int count = Math.max(1, cards.size());
    int room = getWidth() - side - 2 * margin - (count - 1) * gap;
    int width = Math.max(UIScale.scale(60), Math.min(UIScale.scale(MOST_CARD_WIDTH), room / count));
    int height = UIScale.scale(CARD_HEIGHT);
    int x = margin;
    for (LevelCard card : cards) {
      places.add(new Rectangle(x, y(card.decibelsVolt()) - height / 2, width, height));
      x += width + gap;
    }
    int y = margin;
    for (int i = 0; i < beside.size(); i++) {
      int left = getWidth() - UIScale.scale(SIDE_WIDTH) - margin;
      sidePlaces.add(new Rectangle(left, y, UIScale.scale(SIDE_WIDTH), height));
      y += height + UIScale.scale(8);
    }
  }

  private void paintSlopes(Graphics2D g) {
    g.setColor(Look.brass());
    g.setStroke(new BasicStroke(UIScale.scale(2f), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    Path2D clip = new Path2D.Double();
    boolean begun = false;
    for (int i = 0; i < places.size(); i++) {
      Rectangle here = places.get(i);
      if (i > 0) {
        Rectangle former = places.get(i - 1);
        g.drawLine(
            former.x + former.width,
            former.y + former.height / 2,
            here.x,
            here.y + here.height / 2);
      }
      double limit = cards.get(i).decibelsVolt() + cards.get(i).headroomDecibels();
      if (Double.isFinite(limit)) {
        if (begun) {
          clip.lineTo(here.x, y(limit));
        } else {
          clip.moveTo(here.x, y(limit));
        }
        clip.lineTo(here.x + here.width, y(limit));
        begun = true;
      }
    }
    if (begun) {
      g.setColor(Look.severity(earward.block.check.Severity.STOP));
      g.setStroke(
          new BasicStroke(
              UIScale.scale(1.2f),
              BasicStroke.CAP_BUTT,
              BasicStroke.JOIN_ROUND,
              1,
              new float[] {UIScale.scale(5f), UIScale.scale(4f)},
              0));
      g.draw(clip);
    }
  }

  /** Names the broken line over the last card that it stands above. */
  private void sayClipping(Graphics2D g) {
    for (int i = places.size() - 1; i >= 0; i--) {
      double limit = cards.get(i).decibelsVolt() + cards.get(i).headroomDecibels();
      if (Double.isFinite(limit)) {
        Rectangle here = places.get(i);
        String word = Words.of("path.clips");
        int above = Math.min(y(limit), here.y) - UIScale.scale(5);
        g.setColor(Look.severity(earward.block.check.Severity.STOP));
        g.drawString(word, here.x + here.width - g.getFontMetrics().stringWidth(word), above);
        return;
      }
    }
  }

  private void paintCard(Graphics2D g, Rectangle at, String id, String title, String says) {
    boolean chosen = id.equals(workbench.selected());
    int arc = UIScale.scale(7);
    g.setStroke(new BasicStroke(UIScale.scale(chosen ? 2f : 1f)));
    g.setColor(Look.card());
    g.fillRoundRect(at.x, at.y, at.width, at.height, arc, arc);
    g.setColor(chosen ? Look.brass() : Look.line());
    g.drawRoundRect(at.x, at.y, at.width, at.height, arc, arc);
    if (chosen && isFocusOwner()) {
      g.drawRoundRect(at.x - 3, at.y - 3, at.width + 6, at.height + 6, arc, arc);
    }
    int inset = UIScale.scale(8);
    text(g, title, at, inset, UIScale.scale(19), Look.ink(), true);
    text(g, says, at, inset, UIScale.scale(36), Look.quiet(), false);
  }

  private static void text(
      Graphics2D g, String text, Rectangle at, int inset, int down, Color color, boolean strong) {
    java.awt.Font base = g.getFont();
    g.setFont(base.deriveFont(strong ? java.awt.Font.BOLD : java.awt.Font.PLAIN));
    g.setColor(color);
    String shown = text;
    int room = at.width - 2 * inset;
    while (shown.length() > 1 && g.getFontMetrics().stringWidth(shown) > room) {
      shown = shown.substring(0, shown.length() - 2).stripTrailing() + "…";
    }
    g.drawString(shown, at.x + inset, at.y + down);
    g.setFont(base);
  }
}

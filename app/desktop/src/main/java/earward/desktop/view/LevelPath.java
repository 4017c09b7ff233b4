package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.block.Role;
import earward.desktop.model.LevelCard;
import earward.desktop.model.PathLevels;
import earward.desktop.model.Selection;
import earward.desktop.model.SideCard;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Point;
import java.awt.RenderingHints;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.swing.JPanel;
import org.jspecify.annotations.Nullable;

/**
 * The path as level diagram, or folded to a ribbon of names. Arrow keys walk over cards and seams,
 * Enter opens, Insert adds, Delete removes, Alt with an arrow key moves; a card can be dragged.
 */
final class LevelPath extends JPanel {
  private static final long serialVersionUID = 1L;

  private final transient Workbench workbench;
  private final transient BlockCommands commands;
  private transient List<LevelCard> cards = List.of();
  private transient List<SideCard> sides = List.of();
  private transient PathGeometry geometry;
  private boolean ribbon;

  /** A ghost on which the walk stands; empty where it stands on what is selected. */
  private String ghost = "";

  private @Nullable String dragged;

  LevelPath(Workbench workbench, BlockCommands commands) {
    this.workbench = workbench;
    this.commands = commands;
    geometry = new PathGeometry(cards, sides, false, 100, 100);
    setName("level-path");
    setFocusable(true);
    setToolTipText("");
    getAccessibleContext().setAccessibleName(Words.of("path.name"));
    getAccessibleContext().setAccessibleDescription(Words.of("path.help"));
    addMouseListener(mouse());
    Keys.on(this, "LEFT", () -> walk(-1));
    Keys.on(this, "RIGHT", () -> walk(1));
    Keys.on(this, "HOME", () -> go(0));
    Keys.on(this, "END", () -> go(geometry.stops().size() - 1));
    Keys.on(this, "ENTER", this::open);
    Keys.on(this, "INSERT", commands::add);
    Keys.on(this, "DELETE", commands::remove);
    Keys.on(this, "alt LEFT", () -> commands.move(-1));
    Keys.on(this, "alt RIGHT", () -> commands.move(1));
    addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusGained(FocusEvent e) {
            repaint();
          }

          @Override
          public void focusLost(FocusEvent e) {
            repaint();
          }
        });
  }

  private MouseAdapter mouse() {
    return new MouseAdapter() {
      @Override
      public void mousePressed(MouseEvent e) {
        requestFocusInWindow();
        Optional<PathStop> hit = at(e.getPoint());
        hit.ifPresent(LevelPath.this::stand);
        dragged = hit.filter(stop -> !stop.seam() && !stop.ghost()).map(PathStop::id).orElse(null);
        if (hit.filter(PathStop::ghost).isPresent() || e.getClickCount() == 2) {
          open();
        }
      }

      @Override
      public void mouseReleased(MouseEvent e) {
        String block = dragged;
        dragged = null;
        if (block != null) {
          at(e.getPoint())
              .filter(stop -> !stop.id().equals(block) && !stop.ghost())
              .ifPresent(
                  stop -> commands.moveOnto(block, Selection.seamOf(stop.id()).orElse(stop.id())));
        }
      }
    };
  }

  private Optional<PathStop> at(Point point) {
    List<PathStop> stops = geometry.stops();
    for (PathStop stop : stops) {
      if (!stop.seam() && stop.box().contains(point)) {
        return Optional.of(stop);
      }
    }
    return stops.stream().filter(stop -> stop.box().contains(point)).findFirst();
  }

  private String cursor() {
    return ghost.isEmpty() ? workbench.selected() : ghost;
  }

  private void walk(int step) {
    List<String> ids = geometry.stops().stream().map(PathStop::id).toList();
    int now = Math.max(0, ids.indexOf(cursor()));
    go(Math.floorMod(now + step, ids.size()));
  }

  private void go(int index) {
    stand(geometry.stops().get(index));
  }

  private void stand(PathStop stop) {
    ghost = stop.ghost() ? stop.id() : "";
    if (!stop.ghost()) {
      workbench.select(stop.id());
    }
    getAccessibleContext().setAccessibleDescription(stop.says());
    repaint();
  }

  private void open() {
    if (!ghost.isEmpty()) {
      commands.fill(Role.valueOf(ghost.toUpperCase(Locale.ROOT)));
    } else if (Selection.seamOf(workbench.selected()).isPresent()) {
      commands.add();
    } else {
      commands.toSettings();
    }
  }

  @Override
  public @Nullable String getToolTipText(MouseEvent e) {
    return at(e.getPoint()).map(PathStop::says).orElse(null);
  }

  /** Folds to the ribbon, or opens to the diagram. */
  void fold(boolean folded) {
    if (ribbon != folded) {
      ribbon = folded;
      revalidate();
      refresh();
    }
  }

  /** Takes over the present design and its readings. */
  void refresh() {
    cards = PathLevels.of(workbench.workshop(), workbench.shown(), workbench.readings());
    sides = PathLevels.beside(workbench.workshop(), workbench.shown(), workbench.readings());
    geometry = new PathGeometry(cards, sides, ribbon, getWidth(), getHeight());
    if (geometry.stops().stream().noneMatch(stop -> stop.ghost() && stop.id().equals(ghost))) {
      ghost = "";
    }
    repaint();
  }

  @Override
  public Dimension getPreferredSize() {
    return UIScale.scale(
        new Dimension(760, ribbon ? PathGeometry.RIBBON_HEIGHT : PathGeometry.OPEN_HEIGHT));
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.setColor(Look.ground());
    g.fillRect(0, 0, getWidth(), getHeight());
    g.setFont(getFont());
    geometry = new PathGeometry(cards, sides, ribbon, getWidth(), getHeight());
    new PathPainter(g, geometry, cards, sides, cursor(), isFocusOwner()).paint();
    g.dispose();
  }
}

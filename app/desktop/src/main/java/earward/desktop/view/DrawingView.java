package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.block.quantity.Unit;
import earward.desktop.model.Amounts;
import earward.desktop.model.KitDrawing;
import earward.desktop.model.LiveValues;
import earward.desktop.model.Selection;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembly;
import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Font;
import java.awt.event.ComponentAdapter;
import java.awt.event.ComponentEvent;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JToggleButton;
import javax.swing.UIManager;
import net.miginfocom.swing.MigLayout;
import org.jspecify.annotations.Nullable;

/** The drawing of the path or of one block with its live values, or the table that is its twin. */
final class DrawingView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final String DRAWING = "drawing";
  private static final String TABLE = "table";
  private static final String EMPTY = "empty";
  private static final String[] KINDS = {"dc", "audio", "distortion", "carrier", "none"};

  /** What was laid out, so that it is laid out anew only where something in it changed. */
  private record Laid(
      KitDesign design, Map<String, String> references, String only, int width, boolean values) {}

  private final transient Workbench workbench;
  private final transient LiveState live;
  private final DrawingPane pane;
  private final TwinTables tables;
  private final EmptyPath empty;
  private final JPanel deck = new JPanel(new CardLayout());
  private final JScrollPane scroll;
  private final JComboBox<String> kind = new JComboBox<>();
  private final JToggleButton alone = new JToggleButton(Words.of("drawing.alone"));
  private final JToggleButton twin = new JToggleButton(Words.of("drawing.table"));
  private transient @Nullable Laid laid;
  private boolean laying;
  private transient Map<String, String> shownValues = Map.of();

  DrawingView(Workbench workbench, Consumer<String> toField, EmptyPath empty) {
    super(new BorderLayout());
    this.workbench = workbench;
    live = new LiveState(workbench, this::refreshValues);
    pane =
        new DrawingPane(
            place -> workbench.select(place.replaceAll("\\..*", "")),
            place -> toField.accept(workbench.settingOf(place)));
    tables = new TwinTables(place -> toField.accept(workbench.settingOf(place)));
    scroll = new JScrollPane(pane);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(24);
    scroll.getHorizontalScrollBar().setUnitIncrement(24);
    deck.add(scroll, DRAWING);
    deck.add(tables, TABLE);
    deck.add(empty, EMPTY);
    this.empty = empty;
    add(bar(), BorderLayout.NORTH);
    add(deck, BorderLayout.CENTER);
    addComponentListener(
        new ComponentAdapter() {
          @Override
          public void componentResized(ComponentEvent e) {
            refresh();
          }
        });
  }

  private JPanel bar() {
    JPanel bar = new JPanel(new MigLayout("insets 3 8 3 8, gapx 6", "", "[]"));
    for (String each : KINDS) {
      kind.addItem(Words.of("drawing.kind." + each));
    }
    kind.setName("live-kind");
    kind.getAccessibleContext().setAccessibleName(Words.of("drawing.kind"));
    kind.addActionListener(e -> refresh());
    JLabel label = new QuietLabel(Words.of("drawing.kind"));
    label.setLabelFor(kind);
    alone.setName("drawing-alone");
    alone.addActionListener(e -> refresh());
    twin.setName("drawing-twin");
    twin.addActionListener(e -> twin(twin.isSelected()));
    bar.add(label);
    bar.add(kind);
    bar.add(alone);
    bar.add(twin);
    return bar;
  }

  /** Shows the table twin or the drawing. */
  void twin(boolean table) {
    twin.setSelected(table);
    refresh();
  }

  boolean twinShown() {
    return twin.isSelected();
  }

  DrawingPane pane() {
    return pane;
  }

  void larger() {
    pane.larger();
    refresh();
  }

  void smaller() {
    pane.smaller();
    refresh();
  }

  /** Takes over the present design: laid out in the background, values as soon as they come. */
  void refresh() {
    live.refresh();
    boolean nothing = workbench.design().blocks().isEmpty();
    ((CardLayout) deck.getLayout())
        .show(deck, nothing ? EMPTY : twin.isSelected() ? TABLE : DRAWING);
    Optional<Assembly> assembly = workbench.readings().assembly();
    boolean drawn = assembly.isPresent() && !assembly.get().blocks().isEmpty();
    if (drawn) {
      lay(assembly.get());
    }
    refreshValues();
  }

  private void lay(Assembly assembly) {
    String only = alone.isSelected() ? chosenBlock(assembly) : "";
    boolean values = kind.getSelectedIndex() < KINDS.length - 1;
    int width = Math.max(UIScale.scale(200), scroll.getViewport().getWidth());
    double points = pane.pointsAcross(width);
    Laid wanted =
        new Laid(
            assembly.design(),
            assembly.references().parts(),
            only,
            (int) Math.round(points),
            values);
    if (wanted.equals(laid) || laying) {
      return;
    }
    laid = wanted;
    laying = true;
    Font font = UIManager.getFont("defaultFont").deriveFont(12f);
    workbench
        .lanes()
        .pages()
        .start(
            () -> KitDrawing.of(assembly, only, points, font, values),
            drawing -> {
              laying = false;
              pane.show(drawing, shownValues);
              refresh(); // the design may have gone on meanwhile
            },
            fault -> {
              laying = false;
              workbench.say(Words.of("drawing.failed", String.valueOf(fault.getMessage())));
            });
  }

  private String chosenBlock(Assembly assembly) {
    String selected = Selection.seamOf(workbench.selected()).orElse(workbench.selected());
    return assembly.block(selected).isPresent() ? selected : "";
  }

  private void refreshValues() {
    LiveValues values = live.values();
    Map<String, String> texts = new HashMap<>();
    for (LiveValues.Point point : values.points()) {
      texts.put(point.place(), text(point));
    }
    if (!texts.equals(shownValues)) {
      shownValues = texts;
      pane.values(texts);
    }
    if (twin.isSelected()) {
      tables.show(values, workbench.readings().assembly());
    }
  }

  private String text(LiveValues.Point point) {
    return switch (kind.getSelectedIndex()) {
      case 0 -> Amounts.reading(point.dcVolts(), Unit.VOLT);
      case 1 -> Amounts.reading(point.audioVolts(), Unit.VOLT);
      case 2 -> Amounts.reading(point.distortion(), Unit.FRACTION);
      case 3 -> Amounts.reading(point.carrierVolts(), Unit.VOLT);
      default -> "";
    };
  }

  /** Draws everything anew in the colours of the present look. */
  void relook() {
    empty.relook();
    laid = null;
    refresh();
  }
}

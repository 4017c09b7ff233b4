package earward.drawing.internal.page;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Rule;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.place.BlockPlan;
import earward.drawing.internal.route.Router;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.function.ObjIntConsumer;

/** One line of the drawing: titles above, segments below, one line of grounds. Used once. */
final class Line {
  /** Between segments that are not joined. */
  static final double SEGMENT_GAP = 20;

  private static final double TITLE_GAP = 7;
  private static final double GROUND_ROOM = 10;
  private static final double TITLE_INSET = 3;

  private final List<Segment> segments;
  private final Lettering lettering;
  private final List<Element> elements = new ArrayList<>();
  private final IdentityHashMap<BlockPlan, List<Element>> drawn = new IdentityHashMap<>();
  private double top;
  private int groundRow;

  Line(List<Segment> segments, Lettering lettering) {
    this.segments = segments;
    this.lettering = lettering;
  }

  /** The elements of the line and the box of all of it. */
  record Drawn(List<Element> elements, Box box) {}

  Drawn draw() {
    measure();
    double x = 0;
    double titleTop = top;
    double bottom = Grid.points(groundRow) + GROUND_ROOM;
    for (Segment segment : segments) {
      x += x > 0 ? SEGMENT_GAP : 0;
      titleTop = Math.min(titleTop, segment(segment, x));
      for (Cap cap : segment.left()) {
        bottom = Math.max(bottom, cap.bottom());
      }
      x += segment.width();
    }
    seams(titleTop, bottom);
    return new Drawn(elements, new Box(0, titleTop, x, bottom));
  }

  /** Draws the blocks on one line of grounds, and finds the upper edge of all of them. */
  private void measure() {
    groundRow = Integer.MIN_VALUE;
    eachBlock((block, row) -> groundRow = Math.max(groundRow, row + Router.groundRow(block)));
    top = Double.POSITIVE_INFINITY;
    eachBlock(
        (block, row) -> {
          List<Element> all = drawn(block, groundRow - row);
          drawn.put(block, all);
          for (Element element : all) {
            top = Math.min(top, Grid.points(row) + element.bounds().top());
          }
        });
    top = Math.min(top, 0);
  }

  private void eachBlock(ObjIntConsumer<BlockPlan> action) {
    for (Segment segment : segments) {
      List<Integer> origins = segment.origins();
      for (int i = 0; i < origins.size(); i++) {
        action.accept(segment.blocks().get(i), origins.get(i));
      }
    }
  }

  /** Draws a segment and gives the upper edge of its titles. */
  private double segment(Segment segment, double left) {
    double x = left + segment.leftWidth();
    for (Cap cap : segment.left()) {
      elements.addAll(cap.elements(x, Grid.points(cap.row())));
    }
    List<Integer> origins = segment.origins();
    double titleTop = top;
    for (int i = 0; i < origins.size(); i++) {
      BlockPlan block = segment.blocks().get(i);
      int row = origins.get(i);
      double dx = x;
      double dy = Grid.points(row);
      drawn.getOrDefault(block, List.of()).forEach(e -> elements.add(e.moved(dx, dy)));
      double start = i == 0 ? left : x;
      titleTop = Math.min(titleTop, title(block, start, x + Grid.points(block.width())));
      x += Grid.points(block.width());
    }
    int last = origins.get(origins.size() - 1);
    for (Cap cap : segment.right()) {
      elements.addAll(cap.elements(x, Grid.points(last + cap.row())));
    }
    return titleTop;
  }

  private static List<Element> drawn(BlockPlan block, int groundRow) {
    return Router.draw(block, groundRow)
        .or(() -> Router.draw(block, Router.groundRow(block)))
        .orElseThrow(
            () ->
                new IllegalStateException(
                    "block '" + block.task().id() + "' has a wire that finds no way"));
  }

  private double title(BlockPlan block, double x, double end) {
    double limit = end - x - 2 * TITLE_INSET;
    List<String> lines = lettering.wrapped(block.task().title(), limit, Role.TITLE);
    double baseline = top - TITLE_GAP - (lines.size() - 1) * (Lettering.LINE_POINTS + 1);
    double upper = top;
    for (String line : lines) {
      Text text = lettering.at(line, x + TITLE_INSET, baseline, Role.TITLE, "");
      elements.add(text);
      upper = Math.min(upper, text.box().top());
      baseline += Lettering.LINE_POINTS + 1;
    }
    return upper;
  }

  private void seams(double titleTop, double bottom) {
    double x = 0;
    for (Segment segment : segments) {
      x += x > 0 ? SEGMENT_GAP : 0;
      double at = x + segment.leftWidth();
      for (int i = 0; i + 1 < segment.blocks().size(); i++) {
        at += Grid.points(segment.blocks().get(i).width());
        elements.add(0, new Rule(at, titleTop, bottom));
      }
      x += segment.width();
    }
  }
}

package earward.drawing.internal.page;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.place.BlockPlan;
import earward.drawing.internal.place.BlockTask;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/** Arranges blocks in lines of a given width. Used once. */
public final class Page {
  private static final double LINE_GAP = 16;

  private final Lettering lettering;
  private final double width;
  private final String to;
  private final String from;
  private int letters;

  /**
   * An empty page.
   *
   * @param width in points, before the drawing is scaled
   * @param to the word before the block where a wire goes on
   * @param from the word before the block from which it comes
   */
  public Page(Lettering lettering, double width, String to, String from) {
    this.lettering = lettering;
    this.width = width;
    this.to = to;
    this.from = from;
  }

  /** All of the drawing, and the box of each line. */
  public record Laid(List<Element> elements, List<Box> lines) {}

  /**
   * Arranges and draws.
   *
   * @param path in the order of the signal
   * @param beside what stands below
   * @param nodes what is written at nets that go on elsewhere, by net
   */
  public Laid lay(List<BlockPlan> path, List<BlockPlan> beside, Map<String, String> nodes) {
    List<List<Segment>> lines = new ArrayList<>();
    if (!path.isEmpty()) {
      pathLines(path, lines);
    }
    besideLines(beside, nodes, lines);
    List<Element> all = new ArrayList<>();
    List<Box> boxes = new ArrayList<>();
    double y = 0;
    for (List<Segment> segments : lines) {
      Line.Drawn drawn = new Line(segments, lettering).draw();
      double down = y - drawn.box().top();
      drawn.elements().forEach(element -> all.add(element.moved(0, down)));
      boxes.add(drawn.box().moved(0, down));
      y += drawn.box().height() + LINE_GAP;
    }
    return new Laid(all, boxes);
  }

  private void pathLines(List<BlockPlan> path, List<List<Segment>> lines) {
    int[] starts = breaks(path);
    List<Cap> left = ports(path.get(0), true);
    for (int i = 0; i < starts.length; i++) {
      int end = i + 1 < starts.length ? starts[i + 1] : path.size();
      BlockPlan last = path.get(end - 1);
      List<Cap> right = end == path.size() ? ports(last, false) : new ArrayList<>();
      List<Cap> next = new ArrayList<>();
      if (end < path.size()) {
        broken(last, path.get(end), right, next);
      }
      lines.add(List.of(new Segment(path.subList(starts[i], end), left, right)));
      left = next;
    }
  }

  /** The two ends of each wire that a break cuts. */
  private void broken(BlockPlan left, BlockPlan right, List<Cap> ends, List<Cap> starts) {
    int wires = Math.min(left.exitRows().size(), right.entryRows().size());
    for (int i = 0; i < wires; i++) {
      String letter = letter(letters++);
      String onwards = to + " " + right.task().title();
      String back = from + " " + left.task().title();
      int entryRow = right.entryRows().get(i) - right.entryRows().get(0);
      ends.add(Cap.continuation(false, letter, onwards, left.exitRows().get(i), lettering));
      starts.add(Cap.continuation(true, letter, back, entryRow, lettering));
    }
  }

  private static String letter(int index) {
    return index < 26 ? String.valueOf((char) ('A' + index)) : "A" + index;
  }

  private static List<Cap> ports(BlockPlan block, boolean atLeft) {
    BlockTask task = block.task();
    List<String> nets = atLeft ? task.entry() : task.exit();
    List<Integer> rows = atLeft ? block.entryRows() : block.exitRows();
    List<Cap> caps = new ArrayList<>();
    for (int i = 0; i < nets.size(); i++) {
      int row = rows.get(i) - (atLeft ? rows.get(0) : 0);
      caps.add(Cap.port(atLeft, nets.get(i), row));
    }
    return caps;
  }

  /** The first block of each line: as few lines as will do, and then as even as can be. */
  private int[] breaks(List<BlockPlan> path) {
    int n = path.size();
    int savedLetters = letters;
    double[] price = new double[n + 1];
    int[] lastStart = new int[n + 1];
    Arrays.fill(price, Double.POSITIVE_INFINITY);
    price[0] = 0;
    for (int end = 1; end <= n; end++) {
      for (int start = 0; start < end; start++) {
        double wide = lineWidth(path, start, end);
        if (wide <= width || start == end - 1) {
          double slack = Math.max(0, width - wide) / width;
          double cost = price[start] + 100 + slack * slack;
          if (cost < price[end]) {
            price[end] = cost;
            lastStart[end] = start;
          }
        }
      }
    }
    letters = savedLetters;
    List<Integer> starts = new ArrayList<>();
    for (int end = n; end > 0; end = lastStart[end]) {
      starts.add(0, lastStart[end]);
    }
    return starts.stream().mapToInt(start -> start).toArray();
  }

  private double lineWidth(List<BlockPlan> path, int start, int end) {
    List<Cap> left = new ArrayList<>();
    List<Cap> right = new ArrayList<>();
    if (start > 0) {
      broken(path.get(start - 1), path.get(start), new ArrayList<>(), left);
    }
    if (end < path.size()) {
      broken(path.get(end - 1), path.get(end), right, new ArrayList<>());
    }
    return new Segment(path.subList(start, end), left, right).width();
  }

  private void besideLines(
      List<BlockPlan> beside, Map<String, String> nodes, List<List<Segment>> lines) {
    List<Segment> line = new ArrayList<>();
    double used = 0;
    for (BlockPlan block : beside) {
      List<Cap> left = new ArrayList<>();
      for (int i = 0; i < block.entryRows().size(); i++) {
        String name = nodes.get(block.task().entry().get(i));
        int row = block.entryRows().get(i) - block.entryRows().get(0);
        left.add(
            name == null
                ? Cap.port(true, block.task().entry().get(i), row)
                : Cap.node(name, row, lettering));
      }
      Segment segment = new Segment(List.of(block), left, ports(block, false));
      if (!line.isEmpty() && used + Line.SEGMENT_GAP + segment.width() > width) {
        lines.add(line);
        line = new ArrayList<>();
        used = 0;
      }
      used += (line.isEmpty() ? 0 : Line.SEGMENT_GAP) + segment.width();
      line.add(segment);
    }
    if (!line.isEmpty()) {
      lines.add(line);
    }
  }
}

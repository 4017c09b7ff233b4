package earward.drawing.internal.route;

import earward.block.wiring.Nodes;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Lead;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Signs;
import earward.drawing.internal.place.BlockPlan;
import earward.drawing.internal.place.Placed;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Draws the wires of one block. Used once. */
public final class Router {
  private static final int ROOM_ABOVE = 4;
  private static final int GROUND_APART = 3;
  private static final int TRIES = 8;

  private final BlockPlan plan;
  private final int groundRow;
  private final Maze maze;
  private final PathFinder finder;
  private final Map<String, List<Contact>> contacts = new LinkedHashMap<>();
  private final Map<String, Integer> numbers = new LinkedHashMap<>();
  private final Map<String, Wires> wires = new LinkedHashMap<>();
  private final List<Integer> grounds = new ArrayList<>();

  private Router(BlockPlan plan, int groundRow) {
    this.plan = plan;
    this.groundRow = groundRow;
    int top = (int) Math.floor(plan.top() / Grid.CELL_POINTS);
    for (int port : plan.entryRows()) {
      top = Math.min(top, port);
    }
    for (int port : plan.exitRows()) {
      top = Math.min(top, port);
    }
    top -= ROOM_ABOVE;
    this.maze = new Maze(plan.width(), top, groundRow);
    this.finder = new PathFinder(maze);
  }

  /** The least row at which the block's grounds can stand. */
  public static int groundRow(BlockPlan plan) {
    int row = Grid.cellsFor(plan.bottom()) + 1;
    for (int port : plan.entryRows()) {
      row = Math.max(row, port + 2);
    }
    for (int port : plan.exitRows()) {
      row = Math.max(row, port + 2);
    }
    return row;
  }

  /**
   * Everything of the block: symbols, marks, wires, dots and grounds.
   *
   * @param groundRow the row of the ground symbols
   * @return empty where a wire finds no way
   */
  public static Optional<List<Element>> draw(BlockPlan plan, int groundRow) {
    List<String> first = new ArrayList<>();
    for (int i = 0; i < TRIES; i++) {
      Router router = new Router(plan, groundRow);
      Optional<String> stuck = router.route(first);
      if (stuck.isEmpty()) {
        return Optional.of(router.elements());
      }
      if (first.contains(stuck.get()) && first.get(0).equals(stuck.get())) {
        return Optional.empty();
      }
      first.remove(stuck.get());
      first.add(0, stuck.get());
    }
    return Optional.empty();
  }

  private Optional<String> route(List<String> first) {
    plan.placed().forEach(maze::bar);
    for (Placed piece : plan.placed()) {
      for (Lead lead : piece.ends()) {
        contact(piece.nets().getOrDefault(lead.name(), ""), lead.x(), lead.y(), lead.side());
      }
    }
    ports(plan.task().entry(), plan.entryRows(), 0, Side.RIGHT);
    ports(plan.task().exit(), plan.exitRows(), plan.width(), Side.LEFT);
    int ground = numbers.computeIfAbsent(Nodes.GROUND, any -> numbers.size() + 1);
    for (int x = 0; x <= plan.width(); x++) {
      maze.join(maze.cell(x, groundRow), ground);
    }
    for (String net : order(first)) {
      if (!join(net)) {
        return Optional.of(net);
      }
    }
    return Optional.empty();
  }

  private void ports(List<String> nets, List<Integer> rows, int x, Side side) {
    for (int i = 0; i < nets.size(); i++) {
      if (!marked(nets.get(i))) {
        contact(nets.get(i), x, rows.get(i), side);
      }
    }
  }

  private boolean marked(String net) {
    return net.equals(Nodes.GROUND) || (Nodes.isRail(net) && !plan.task().lanes().contains(net));
  }

  private void contact(String net, int x, int y, Side side) {
    int number = numbers.computeIfAbsent(net, any -> numbers.size() + 1);
    int cell = maze.cell(x, y);
    maze.open(cell, number);
    contacts.computeIfAbsent(net, any -> new ArrayList<>()).add(new Contact(cell, side));
    wires.computeIfAbsent(net, any -> new Wires(maze)).contact(cell);
  }

  private List<String> order(List<String> first) {
    List<String> nets = new ArrayList<>(contacts.keySet());
    nets.sort(
        Comparator.comparing((String net) -> !first.contains(net))
            .thenComparing(first::indexOf)
            .thenComparing(net -> net.equals(Nodes.GROUND))
            .thenComparing(net -> rows(net) > 1)
            .thenComparing(this::reach));
    return nets;
  }

  private long rows(String net) {
    return contactsOf(net).stream().map(c -> maze.y(c.cell())).distinct().count();
  }

  private int reach(String net) {
    var xs = contactsOf(net).stream().mapToInt(c -> maze.x(c.cell())).summaryStatistics();
    var ys = contactsOf(net).stream().mapToInt(c -> maze.y(c.cell())).summaryStatistics();
    return xs.getMax() - xs.getMin() + ys.getMax() - ys.getMin();
  }

  private List<Contact> contactsOf(String net) {
    return contacts.getOrDefault(net, List.of());
  }

  private boolean join(String net) {
    if (net.equals(Nodes.GROUND)) {
      return contactsOf(net).stream().allMatch(this::ground);
    }
    List<Contact> left = new ArrayList<>(contactsOf(net));
    BitSet tree = new BitSet();
    if (marked(net)) {
      return joinToMarks(net, left);
    }
    int row = mainRow(left);
    left.sort(
        Comparator.comparing((Contact c) -> maze.y(c.cell()) != row)
            .thenComparing(c -> maze.x(c.cell())));
    take(left.remove(0).cell(), left, tree);
    while (!left.isEmpty()) {
      List<Contact> level = left.stream().filter(c -> maze.y(c.cell()) == row).toList();
      Contact next = nearest(level.isEmpty() ? left : level, tree);
      left.remove(next);
      if (connect(net, next, tree).isEmpty()) {
        return false;
      }
      take(next.cell(), left, tree);
    }
    return true;
  }

  /** The row in which most of them stand, the upper one of equals: drawn first, and straight. */
  private int mainRow(List<Contact> ends) {
    TreeMap<Integer, Integer> counts = new TreeMap<>();
    ends.forEach(c -> counts.merge(maze.y(c.cell()), 1, Integer::sum));
    int row = 0;
    int most = 0;
    for (Map.Entry<Integer, Integer> count : counts.entrySet()) {
      if (count.getValue() > most) {
        row = count.getKey();
        most = count.getValue();
      }
    }
    return row;
  }

  /** Each end of a rail goes to the nearest of its marks. */
  private boolean joinToMarks(String net, List<Contact> left) {
    BitSet marks = new BitSet();
    for (Placed piece : plan.placed()) {
      if (piece.kind().filter(kind -> kind == Mark.Kind.RAIL).isPresent()
          && piece.name().equals(net)) {
        marks.set(maze.cell(piece.x(), piece.y()));
      }
    }
    if (marks.isEmpty()) {
      return false;
    }
    for (Contact contact : left) {
      if (!marks.get(contact.cell()) && connect(net, contact, marks).isEmpty()) {
        return false;
      }
    }
    return true;
  }

  private static void take(int cell, List<Contact> left, BitSet tree) {
    tree.set(cell);
    left.removeIf(contact -> tree.get(contact.cell()));
  }

  private Contact nearest(List<Contact> left, BitSet tree) {
    Contact best = left.get(0);
    int least = Integer.MAX_VALUE;
    for (Contact contact : left) {
      int x = maze.x(contact.cell());
      int y = maze.y(contact.cell());
      for (int c = tree.nextSetBit(0); c >= 0; c = tree.nextSetBit(c + 1)) {
        int dy = Math.abs(maze.y(c) - y);
        int far = Math.abs(maze.x(c) - x) + dy + (dy > 0 ? 2 : 0);
        if (far < least) {
          least = far;
          best = contact;
        }
      }
    }
    return best;
  }

  /** Lays the cheapest wire to a goal and gives the cell where it arrived. */
  private Optional<Integer> connect(String net, Contact from, BitSet goals) {
    int number = numbers.getOrDefault(net, Maze.NOBODY);
    List<Integer> path = finder.find(from.cell(), from.side().opposite(), goals, number);
    if (path.isEmpty()) {
      return Optional.empty();
    }
    Wires drawn = wires.computeIfAbsent(net, any -> new Wires(maze));
    for (int i = 1; i < path.size(); i++) {
      maze.lay(path.get(i - 1), path.get(i), number);
      drawn.step(path.get(i - 1), path.get(i));
      boolean corner =
          i + 1 < path.size() && path.get(i) - path.get(i - 1) != path.get(i + 1) - path.get(i);
      if (corner || i + 1 == path.size()) {
        maze.join(path.get(i), number);
      }
    }
    path.forEach(goals::set);
    return Optional.of(path.get(path.size() - 1));
  }

  /** Straight down to the line of grounds where that is free. */
  private boolean ground(Contact from) {
    BitSet goals = new BitSet();
    for (int x = 2; x <= plan.width() - 2; x++) {
      int at = x;
      if (grounds.stream().allMatch(g -> g == at || Math.abs(g - at) >= GROUND_APART)) {
        goals.set(maze.cell(x, groundRow));
      }
    }
    BitSet reached = (BitSet) goals.clone();
    Optional<Integer> end = connect(Nodes.GROUND, from, reached);
    if (end.isEmpty()) {
      return false;
    }
    int x = maze.x(end.get());
    if (!grounds.contains(x)) {
      grounds.add(x);
      wires.computeIfAbsent(Nodes.GROUND, any -> new Wires(maze)).contact(end.get());
    }
    return true;
  }

  private List<Element> elements() {
    List<Element> elements = new ArrayList<>();
    wires.values().forEach(drawn -> drawn.addTo(elements));
    plan.placed().forEach(piece -> elements.addAll(piece.elements()));
    Form ground = Signs.ground();
    for (int x : grounds) {
      Placed sign =
          new Placed(
              ground,
              x,
              groundRow,
              Nodes.GROUND,
              Optional.of(Mark.Kind.GROUND),
              Map.of("", Nodes.GROUND));
      elements.addAll(sign.elements());
    }
    return elements;
  }
}

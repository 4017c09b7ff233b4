package earward.drawing.internal.place;

import earward.block.device.AudioAmplifier;
import earward.block.device.Pin;
import earward.block.device.Terminal;
import earward.block.wiring.Nodes;
import earward.block.wiring.Placement;
import earward.drawing.internal.element.Text.Role;
import earward.drawing.internal.form.Boxed;
import earward.drawing.internal.form.Boxed.PinPlace;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Grid;
import earward.drawing.internal.form.Side;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * Gives each pin of a boxed symbol the side on which its neighbours stand: inputs left, outputs
 * right, rails above, ground and what hangs below. Used once.
 */
final class PinSides {
  private static final int ROW = 4;
  private static final int EXTRA = 6;
  private static final int PAIR = 10;
  private static final int EDGE = 3;
  private static final int LEAST_HALF_HEIGHT = 5;
  private static final double AIR = 6;

  private final Board board;
  private final Part part;
  private final int entryRow;
  private final Map<Side, List<PinPlace>> pins = new EnumMap<>(Side.class);
  private final List<Terminal> bridged = new ArrayList<>();

  PinSides(Board board, Part part, int entryRow) {
    this.board = board;
    this.part = part;
    this.entryRow = entryRow;
  }

  Form form() {
    Map<Side, List<Terminal>> sides = new EnumMap<>(Side.class);
    for (Terminal terminal : part.device().terminals()) {
      if (part.nets().containsKey(terminal)) {
        sides.computeIfAbsent(side(terminal), any -> new ArrayList<>()).add(terminal);
      }
    }
    left(sides.getOrDefault(Side.LEFT, List.of()));
    right(sides.getOrDefault(Side.RIGHT, List.of()));
    double upper = row(Side.UP, sides.getOrDefault(Side.UP, List.of()));
    double lower = row(Side.DOWN, sides.getOrDefault(Side.DOWN, List.of()));
    double middle =
        widest(Side.LEFT) + widest(Side.RIGHT) + board.lettering.widest(part.label()) + 4 * AIR;
    int inner = Grid.cellsFor(Math.max(middle, Math.max(upper, lower)));
    centre(Side.UP, inner);
    boolean amplifier = part.device() instanceof AudioAmplifier;
    return Boxed.of(
        pins, inner, edge(true), edge(false), amplifier, part.label(), part.key(), board.lettering);
  }

  private Side side(Terminal terminal) {
    String net = part.net(terminal);
    if (terminal == part.entering()) {
      return Side.LEFT;
    } else if (terminal == Terminal.SUPPLY || (Nodes.isRail(net) && board.marked(net))) {
      return Side.UP;
    } else if (terminal == Terminal.GROUND || net.equals(Nodes.GROUND)) {
      return Side.DOWN;
    } else if (terminal == Terminal.OUTPUT
        || terminal == Terminal.OUTPUT_TWO
        || board.task.exit().contains(net)
        || comes(net, Placement.RUN)) {
      return Side.RIGHT;
    } else if (board.spot(net) != null) {
      return Side.LEFT;
    } else if (comes(net, Placement.DOWN)) {
      return Side.DOWN;
    } else if (comes(net, Placement.UP)) {
      return Side.UP;
    } else if (board.pending.stream().anyMatch(p -> bridges(p, net))) {
      bridged.add(terminal);
      return Side.RIGHT;
    }
    return Side.LEFT;
  }

  private boolean comes(String net, Placement placement) {
    return board.pending.stream()
        .anyMatch(p -> !p.equals(part) && p.placement() == placement && p.from().equals(net));
  }

  private boolean bridges(Part other, String net) {
    return !other.equals(part) && other.placement() == Placement.BRIDGE && other.touches(net);
  }

  private void left(List<Terminal> terminals) {
    int next = ROW;
    pins.put(Side.LEFT, new ArrayList<>(List.of(place(part.entering(), 0))));
    for (Terminal terminal : terminals) {
      if (terminal == part.entering()) {
        continue;
      }
      Spot spot = board.spot(part.net(terminal));
      int wished = spot == null ? next : spot.y - entryRow;
      int row = wished >= next ? wished : next;
      pins.get(Side.LEFT).add(place(terminal, row));
      next = Math.max(next, row + ROW);
    }
  }

  private void right(List<Terminal> terminals) {
    List<PinPlace> places = new ArrayList<>();
    List<Terminal> plain = terminals.stream().filter(t -> !bridged.contains(t)).toList();
    int row = 0;
    for (Terminal terminal : plain) {
      places.add(place(terminal, row));
      row += PAIR;
    }
    int above = plain.isEmpty() ? 0 : -EXTRA;
    int below = Math.max(EXTRA, row - PAIR + EXTRA);
    for (int i = 0; i < bridged.size(); i++) {
      boolean up = plain.size() > 1 || i % 2 == 0;
      places.add(place(bridged.get(i), up ? above : below));
      above -= up ? EXTRA : 0;
      below += up ? 0 : EXTRA;
    }
    pins.put(Side.RIGHT, places);
  }

  /** Pins along the upper or lower edge, far enough apart for what hangs there; the length. */
  private double row(Side side, List<Terminal> terminals) {
    List<PinPlace> places = new ArrayList<>();
    int at = EDGE;
    List<Terminal> ordered = new ArrayList<>(terminals);
    ordered.sort((a, b) -> Boolean.compare(markedAt(a), markedAt(b)));
    for (Terminal terminal : ordered) {
      places.add(place(terminal, at));
      at += Grid.cellsFor(Math.max(14, 13 + hangingWidth(part.net(terminal))));
    }
    pins.put(side, places);
    Terminal last = ordered.isEmpty() ? null : ordered.get(ordered.size() - 1);
    double lastHalf =
        last == null ? 0 : board.lettering.width(Boxed.name(last), Role.PIN) / 2 + AIR;
    return places.isEmpty()
        ? 0
        : Grid.points(places.get(places.size() - 1).offset()) + Math.max(lastHalf, 15);
  }

  private boolean markedAt(Terminal terminal) {
    return board.marked(part.net(terminal));
  }

  /** Width of what will hang or stand at a net that has no place yet. */
  double hangingWidth(String net) {
    if (board.marked(net)) {
      return 0;
    }
    double widest = 0;
    for (Part other : board.pending) {
      boolean chained = other.placement() == Placement.DOWN || other.placement() == Placement.UP;
      if (chained && other.twoEnded() && other.from().equals(net)) {
        for (Part link : new Chains(board).chainOf(other)) {
          widest = Math.max(widest, board.lettering.widest(link.label()) + 12);
        }
      }
    }
    return widest;
  }

  /** A single pin stands in the middle of its edge. */
  private void centre(Side side, int inner) {
    List<PinPlace> places = pins.getOrDefault(side, List.of());
    if (places.size() == 1) {
      pins.put(side, List.of(place(places.get(0).terminal(), inner / 2)));
    }
  }

  private double widest(Side side) {
    return pins.getOrDefault(side, List.of()).stream()
        .mapToDouble(pin -> board.lettering.width(Boxed.name(pin.terminal()), Role.PIN))
        .max()
        .orElse(0);
  }

  private int edge(boolean top) {
    List<PinPlace> beside = new ArrayList<>(pins.getOrDefault(Side.LEFT, List.of()));
    beside.addAll(pins.getOrDefault(Side.RIGHT, List.of()));
    int least = beside.stream().mapToInt(PinPlace::offset).min().orElse(0);
    int most = beside.stream().mapToInt(PinPlace::offset).max().orElse(0);
    int missing = Math.max(0, 2 * LEAST_HALF_HEIGHT - (most - least + 2 * EDGE));
    return top ? least - EDGE - missing / 2 : most + EDGE + (missing + 1) / 2;
  }

  private PinPlace place(Terminal terminal, int offset) {
    String numbers =
        part.device() instanceof AudioAmplifier amplifier
            ? amplifier.pins().stream()
                .filter(pin -> pin.terminal() == terminal)
                .map(Pin::number)
                .sorted()
                .collect(Collectors.collectingAndThen(Collectors.toList(), PinSides::ranges))
            : "";
    return new PinPlace(terminal, numbers, offset);
  }

  /** Numbers in a row as a range: 3-5,10. */
  private static String ranges(List<Integer> numbers) {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < numbers.size(); i++) {
      int first = numbers.get(i);
      while (i + 1 < numbers.size() && numbers.get(i + 1) == numbers.get(i) + 1) {
        i++;
      }
      int last = numbers.get(i);
      text.append(text.length() > 0 ? "," : "").append(first);
      text.append(last > first ? (last > first + 1 ? "\u2013" : ",") + last : "");
    }
    return text.toString();
  }
}

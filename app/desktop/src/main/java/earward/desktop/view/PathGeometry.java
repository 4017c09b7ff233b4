package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.desktop.model.LevelCard;
import earward.desktop.model.Selection;
import earward.desktop.model.SideCard;
import earward.desktop.model.Words;
import java.awt.Rectangle;
import java.util.ArrayList;
import java.util.List;

/** Where cards, seams and side cards stand in a given width and height. */
final class PathGeometry {
  static final int RIBBON_HEIGHT = 46;
  static final int OPEN_HEIGHT = 196;
  private static final int CARD_HEIGHT = 42;
  private static final int SIDE_HEIGHT = 36;
  private static final int MARGIN = 10;
  private static final int GAP = 26;
  private static final int RIBBON_GAP = 16;
  private static final int FIRST_WIDTH = 108;
  private static final int MOST_WIDTH = 190;
  private static final int LEAST_SPAN = 12;

  private final List<LevelCard> cards;
  private final List<SideCard> sides;
  private final boolean ribbon;
  private final int width;
  private final int height;
  private final List<PathStop> stops = new ArrayList<>();
  private final List<Rectangle> cardBoxes = new ArrayList<>();
  private final List<Rectangle> sideBoxes = new ArrayList<>();
  private double low;
  private double high;

  PathGeometry(List<LevelCard> cards, List<SideCard> sides, boolean ribbon, int width, int height) {
    this.cards = cards;
    this.sides = sides;
    this.ribbon = ribbon;
    this.width = width;
    this.height = height;
    span();
    place();
  }

  List<PathStop> stops() {
    return stops;
  }

  List<Rectangle> cardBoxes() {
    return cardBoxes;
  }

  List<Rectangle> sideBoxes() {
    return sideBoxes;
  }

  boolean ribbon() {
    return ribbon;
  }

  private void span() {
    low = Double.POSITIVE_INFINITY;
    high = Double.NEGATIVE_INFINITY;
    for (LevelCard card : cards) {
      take(card.decibelsVolt());
      take(card.decibelsVolt() + card.headroomDecibels());
    }
    if (!(high > low)) {
      low = Double.isFinite(low) ? low - LEAST_SPAN / 2.0 : -LEAST_SPAN;
      high = low + LEAST_SPAN;
    }
  }

  private void take(double level) {
    if (Double.isFinite(level)) {
      low = Math.min(low, level);
      high = Math.max(high, level);
    }
  }

  /** The height of a level; what lies below the diagram stands at its foot. */
  int y(double level) {
    int half = UIScale.scale(CARD_HEIGHT / 2 + MARGIN);
    int foot = height - UIScale.scale(SIDE_HEIGHT + MARGIN) - half;
    double known = Double.isFinite(level) ? level : (low + high) / 2;
    double share = Math.max(-0.12, (known - low) / (high - low));
    return (int) Math.round(foot - share * (foot - half));
  }

  private void place() {
    int margin = UIScale.scale(MARGIN);
    int gap = UIScale.scale(ribbon ? RIBBON_GAP : GAP);
    int first = UIScale.scale(FIRST_WIDTH);
    int besideCount = ribbon ? sides.size() : 0;
    int boxes = cards.size() + besideCount;
    int room = width - 2 * margin - first - gap * boxes - (besideCount > 0 ? margin : 0);
    int each =
        Math.max(UIScale.scale(44), Math.min(UIScale.scale(MOST_WIDTH), room / Math.max(1, boxes)));
    int cardHeight = ribbon ? height - 2 * UIScale.scale(4) : UIScale.scale(CARD_HEIGHT);
    int middle = ribbon ? height / 2 : y(Double.NaN);
    stops.add(
        new PathStop(
            Selection.CONDITIONS,
            LevelCard.Kind.BLOCK,
            new Rectangle(margin, middle - cardHeight / 2, first, cardHeight),
            false,
            Words.of("form.conditions")));
    int x = margin + first + gap;
    Rectangle former = null;
    for (LevelCard card : cards) {
      int y = ribbon ? middle : y(card.decibelsVolt());
      Rectangle box = new Rectangle(x, y - cardHeight / 2, each, cardHeight);
      if (former != null && card.kind() != LevelCard.Kind.GHOST) {
        stops.add(seam(former, box, card));
      }
      cardBoxes.add(box);
      stops.add(
          new PathStop(card.id(), card.kind(), box, false, card.title() + ", " + card.level()));
      former = box;
      x += each + gap;
    }
    sides(x, each, cardHeight, gap);
  }

  private static PathStop seam(Rectangle left, Rectangle right, LevelCard card) {
    int from = left.x + left.width;
    int top = Math.min(left.y, right.y) + left.height / 4;
    int bottom = Math.max(left.y, right.y) + left.height * 3 / 4;
    return new PathStop(
        Selection.seam(card.id()),
        card.kind(),
        new Rectangle(from, top, right.x - from, bottom - top),
        true,
        Words.of("path.seam", card.title()));
  }

  /** In the ribbon behind the path; else at the foot, a take-off under the block it hangs on. */
  private void sides(int after, int each, int cardHeight, int gap) {
    int x = after;
    int sideHeight = UIScale.scale(SIDE_HEIGHT);
    int foot = height - sideHeight - UIScale.scale(MARGIN) / 2;
    int next = width - UIScale.scale(MARGIN);
    for (SideCard side : sides) {
      Rectangle box;
      if (ribbon) {
        box = new Rectangle(x, height / 2 - cardHeight / 2, each, cardHeight);
        x += each + gap;
      } else {
        int wide = Math.min(each, UIScale.scale(150));
        int hung = hung(side.joinsAt());
        int left = hung >= 0 ? cardBoxes.get(hung).x + cardBoxes.get(hung).width / 4 : next - wide;
        if (hung < 0) {
          next -= wide + gap;
        }
        box = new Rectangle(free(left, wide), foot, wide, sideHeight);
      }
      sideBoxes.add(box);
      stops.add(
          new PathStop(side.id(), side.kind(), box, false, side.title() + ", " + side.says()));
    }
  }

  /** Two that hang on the same block stand beside each other. */
  private int free(int left, int wide) {
    int at = left;
    for (Rectangle taken : sideBoxes) {
      if (at < taken.x + taken.width && taken.x < at + wide) {
        at = taken.x + taken.width + UIScale.scale(8);
      }
    }
    return at;
  }

  /** The card of a block; -1 where it has none. */
  int hung(String blockId) {
    for (int i = 0; i < cards.size(); i++) {
      if (cards.get(i).id().equals(blockId)) {
        return i;
      }
    }
    return -1;
  }
}

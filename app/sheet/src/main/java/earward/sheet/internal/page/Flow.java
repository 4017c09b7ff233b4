package earward.sheet.internal.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Puts pieces on pages, from the top. */
public final class Flow {
  /**
   * A piece in its place.
   *
   * @param piece what
   * @param y its upper edge on the paper
   */
  public record Placed(Piece piece, float y) {}

  private final float width;
  private final float height;
  private final List<List<Placed>> pages = new ArrayList<>();
  private List<Placed> page = new ArrayList<>();
  private float used;

  private Flow(Sheet sheet) {
    this.width = sheet.contentWidth();
    this.height = sheet.contentHeight();
    pages.add(page);
  }

  /** The pages, each with its pieces; a piece that is higher than a page stands alone on one. */
  public static List<List<Placed>> over(Sheet sheet, List<Piece> pieces) {
    Flow flow = new Flow(sheet);
    for (int from = 0; from < pieces.size(); ) {
      int to = from + 1;
      while (pieces.get(to - 1).keptWithNext() && to < pieces.size()) {
        to++;
      }
      int rest = Math.min(pieces.size(), from + 1 + pieces.get(from).together());
      flow.breakBefore(pieces.subList(from, Math.max(to, rest)));
      flow.put(pieces.subList(from, to));
      from = to;
    }
    return List.copyOf(flow.pages);
  }

  /** Begins a page where what should stay together does not fit here, but fits on one page. */
  private void breakBefore(List<Piece> section) {
    float whole = heightOf(section);
    boolean fits = used + section.get(0).spaceAbove() + whole <= height;
    if (!page.isEmpty() && !fits && whole <= height) {
      newPage();
    }
  }

  private void newPage() {
    page = new ArrayList<>();
    pages.add(page);
    used = 0;
  }

  private void put(List<Piece> together) {
    Piece first = together.get(0);
    boolean fits = used + first.spaceAbove() + heightOf(together) <= height;
    if (!page.isEmpty() && (first.beginsPage() || !fits)) {
      newPage();
    }
    if (page.isEmpty()) {
      Optional<Piece> repeated = first.repeatedAbove();
      repeated.ifPresent(this::place);
    }
    together.forEach(this::place);
  }

  private float heightOf(List<Piece> together) {
    float sum = 0;
    for (int i = 0; i < together.size(); i++) {
      sum += together.get(i).height(width) + (i == 0 ? 0 : together.get(i).spaceAbove());
    }
    return sum;
  }

  private void place(Piece piece) {
    used += page.isEmpty() ? 0 : piece.spaceAbove();
    page.add(new Placed(piece, Sheet.TOP + used));
    used += piece.height(width);
  }
}

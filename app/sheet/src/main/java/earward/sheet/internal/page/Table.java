package earward.sheet.internal.page;

import earward.sheet.internal.page.Style.Tone;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A table whose head is repeated on every page that it goes on to. Rows are separated by hairlines;
 * there are no vertical rules.
 */
public final class Table {
  private static final float GUTTER = 8;
  private static final float PADDING = 4;
  private static final float HEAD_PADDING = 3;
  private static final float HEAD_RULE = 0.9f;
  private static final float HAIRLINE = 0.35f;

  private final List<Column> columns;
  private final float leastRowHeight;
  private final Piece head;
  private final List<Piece> pieces = new ArrayList<>();

  /**
   * An empty table.
   *
   * @param columns from the left; exactly one takes what is left
   * @param leastRowHeight in points; what a pen needs where readings are written
   */
  public Table(List<Column> columns, float leastRowHeight) {
    this.columns = List.copyOf(columns);
    this.leastRowHeight = leastRowHeight;
    if (columns.stream().filter(column -> column.points() == 0).count() != 1) {
      throw new IllegalArgumentException("exactly one column of a table takes what is left");
    }
    head = new Head();
    pieces.add(head);
  }

  /** A heading between rows, kept with the row after it. */
  public void group(String title) {
    pieces.add(new Group(title));
  }

  /** A row. */
  public void row(List<Cell> cells) {
    if (cells.size() != columns.size()) {
      throw new IllegalArgumentException(
          "a row of " + cells.size() + " cells in a table of " + columns.size() + " columns");
    }
    pieces.add(new Row(List.copyOf(cells)));
  }

  /** Head and rows. */
  public List<Piece> pieces() {
    return List.copyOf(pieces);
  }

  private float widthOf(int index, float width) {
    float points = columns.get(index).points();
    if (points > 0) {
      return points;
    }
    float taken = GUTTER * (columns.size() - 1);
    for (Column column : columns) {
      taken += column.points();
    }
    return Math.max(1, width - taken);
  }

  /** The titles. */
  private final class Head implements Piece {
    @Override
    public float height(float width) {
      float most = 0;
      for (int i = 0; i < columns.size(); i++) {
        most = Math.max(most, cell(i).height(widthOf(i, width)));
      }
      return most + 2 * HEAD_PADDING;
    }

    private Cell cell(int index) {
      Column column = columns.get(index);
      return new TextCell(column.title(), Style.LABEL_STRONG, column.toRight());
    }

    @Override
    public void draw(Canvas canvas, float x, float y, float width) {
      float high = height(width);
      float at = x;
      for (int i = 0; i < columns.size(); i++) {
        float wide = widthOf(i, width);
        Cell cell = cell(i);
        float foot = y + high - HEAD_PADDING - cell.height(wide);
        cell.draw(canvas, at, foot, wide, cell.height(wide));
        at += wide + GUTTER;
      }
      canvas.line(x, y + high, x + width, y + high, HEAD_RULE, Tone.INK);
    }

    @Override
    public boolean keptWithNext() {
      return true;
    }
  }

  /** A heading between rows. */
  private final class Group implements Piece {
    private static final float ABOVE = 7;
    private final String title;

    Group(String title) {
      this.title = title;
    }

    @Override
    public float height(float width) {
      return ABOVE + Style.STRONG.leading() * Lines.of(title, Style.STRONG, width).size() + 2;
    }

    @Override
    public void draw(Canvas canvas, float x, float y, float width) {
      float baseline = y + ABOVE + Style.STRONG.rise();
      for (String line : Lines.of(title, Style.STRONG, width)) {
        canvas.text(line, x, baseline, Style.STRONG);
        baseline += Style.STRONG.leading();
      }
      float foot = y + height(width);
      canvas.line(x, foot, x + width, foot, HAIRLINE, Tone.DARK);
    }

    @Override
    public boolean keptWithNext() {
      return true;
    }

    @Override
    public Optional<Piece> repeatedAbove() {
      return Optional.of(head);
    }
  }

  /** One row. */
  private final class Row implements Piece {
    private final List<Cell> cells;

    Row(List<Cell> cells) {
      this.cells = cells;
    }

    @Override
    public float height(float width) {
      float most = leastRowHeight - 2 * PADDING;
      for (int i = 0; i < cells.size(); i++) {
        most = Math.max(most, cells.get(i).height(widthOf(i, width)));
      }
      return most + 2 * PADDING;
    }

    @Override
    public void draw(Canvas canvas, float x, float y, float width) {
      float inner = height(width) - 2 * PADDING;
      float at = x;
      for (int i = 0; i < cells.size(); i++) {
        float wide = widthOf(i, width);
        cells.get(i).draw(canvas, at, y + PADDING, wide, inner);
        at += wide + GUTTER;
      }
      float foot = y + height(width);
      canvas.line(x, foot, x + width, foot, HAIRLINE, Tone.HAIR);
    }

    @Override
    public Optional<Piece> repeatedAbove() {
      return Optional.of(head);
    }
  }
}

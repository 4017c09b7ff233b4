package earward.sheet.internal.section;

import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Piece;
import java.util.List;

/**
 * Pieces one below the other that stay together.
 *
 * @param pieces from the top
 */
record Stack(List<Piece> pieces) implements Piece {
  Stack {
    pieces = List.copyOf(pieces);
  }

  @Override
  public float height(float width) {
    float sum = 0;
    for (int i = 0; i < pieces.size(); i++) {
      sum += (i == 0 ? 0 : pieces.get(i).spaceAbove()) + pieces.get(i).height(width);
    }
    return sum;
  }

  @Override
  public void draw(Canvas canvas, float x, float y, float width) {
    float at = y;
    for (int i = 0; i < pieces.size(); i++) {
      at += i == 0 ? 0 : pieces.get(i).spaceAbove();
      pieces.get(i).draw(canvas, x, at, width);
      at += pieces.get(i).height(width);
    }
  }
}

package earward.sheet.internal.page;

import earward.kit.design.SheetOptions.Paper;

/**
 * The paper and its margins, in points.
 *
 * @param width of the paper
 * @param height of the paper
 */
public record Sheet(float width, float height) {
  /** 15 mm to the left and right. */
  public static final float SIDE = 42.5f;

  /** Above the content; the mark of a stopped design stands in it. */
  public static final float TOP = 48;

  /** Below the content; the foot of the page stands in it. */
  public static final float BOTTOM = 50;

  /** Nothing is printed nearer to the edge than this: 7 mm, which every printer can do. */
  public static final float EDGE = 20;

  /** The sheet of a paper size. */
  public static Sheet of(Paper paper) {
    return new Sheet((float) paper.widthPoints(), (float) paper.heightPoints());
  }

  /** Width between the margins. */
  public float contentWidth() {
    return width - 2 * SIDE;
  }

  /** Height between the margins. */
  public float contentHeight() {
    return height - TOP - BOTTOM;
  }
}

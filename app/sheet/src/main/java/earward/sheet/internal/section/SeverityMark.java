package earward.sheet.internal.section;

import earward.block.check.Severity;
import earward.sheet.internal.page.Canvas;

/** The shape of a severity: a full octagon, a half-filled diamond, a circle. */
final class SeverityMark {
  private static final float LINE = 0.9f;

  private SeverityMark() {}

  /**
   * Draws it.
   *
   * @param x of its middle
   * @param y of its middle
   * @param radius of the circle in which it fits
   */
  static void draw(Canvas canvas, Severity severity, float x, float y, float radius) {
    switch (severity) {
      case STOP -> canvas.polygon(octagon(x, y, radius), LINE, true);
      case WEIGH -> {
        float[] diamond = {x, y - radius, x + radius, y, x, y + radius, x - radius, y};
        float[] lower = {x - radius, y, x + radius, y, x, y + radius};
        canvas.polygon(lower, LINE / 2, true);
        canvas.polygon(diamond, LINE, false);
      }
      case NOTE -> canvas.circle(x, y, radius * 0.86f, LINE);
    }
  }

  static float[] octagon(float x, float y, float radius) {
    float[] corners = new float[16];
    for (int i = 0; i < 8; i++) {
      double angle = Math.PI / 8 + i * Math.PI / 4;
      corners[2 * i] = (float) (x + radius * Math.cos(angle));
      corners[2 * i + 1] = (float) (y + radius * Math.sin(angle));
    }
    return corners;
  }
}

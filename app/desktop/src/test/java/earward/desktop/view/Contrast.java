package earward.desktop.view;

import java.awt.Color;
import java.awt.Component;

/** Contrast of text with what is behind it, after WCAG 2.1, definition of contrast ratio. */
final class Contrast {
  private Contrast() {}

  static double of(Color text, Color ground) {
    double one = luminance(text);
    double other = luminance(ground);
    return (Math.max(one, other) + 0.05) / (Math.min(one, other) + 0.05);
  }

  private static double luminance(Color color) {
    return 0.2126 * linear(color.getRed())
        + 0.7152 * linear(color.getGreen())
        + 0.0722 * linear(color.getBlue());
  }

  private static double linear(int channel) {
    double share = channel / 255.0;
    return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }

  /** The ground of the nearest container that paints one. */
  static Color behind(Component text) {
    Component at = text.getParent();
    while (at != null && !at.isOpaque()) {
      at = at.getParent();
    }
    return at == null ? Color.WHITE : at.getBackground();
  }
}

package earward.drawing.internal.element;

import java.awt.Shape;
import java.awt.geom.AffineTransform;

/**
 * One line or filled form of a symbol.
 *
 * @param shape in points; never changed
 * @param style how it is drawn
 */
public record Stroke(Shape shape, Style style) {
  /** How a form is drawn. */
  public enum Style {
    /** The usual line of a symbol. */
    LINE,
    /** As thin as a wire: leads. */
    LEAD,
    /** Thick: ground bars, the base bar of a transistor. */
    BOLD,
    /** Filled with ink. */
    FILLED,
    /** A dashed outline: a screen. */
    DASHED
  }

  /** The same form, transformed. */
  public Stroke transformed(AffineTransform by) {
    return new Stroke(by.createTransformedShape(shape), style);
  }
}

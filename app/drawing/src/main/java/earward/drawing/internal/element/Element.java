package earward.drawing.internal.element;

/** One thing on the drawing. Immutable. */
public sealed interface Element permits Wire, Dot, Mark, Symbol, Text, Rule {
  /** The same thing elsewhere. */
  Element moved(double dx, double dy);

  /** The box that it fills. */
  Box bounds();
}

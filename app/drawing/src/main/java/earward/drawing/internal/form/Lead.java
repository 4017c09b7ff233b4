package earward.drawing.internal.form;

/**
 * An end of a form.
 *
 * @param name the terminal; empty for the only end of a mark
 * @param x in cells from the form's origin
 * @param y in cells from the form's origin
 * @param side the way it points
 */
public record Lead(String name, int x, int y, Side side) {}

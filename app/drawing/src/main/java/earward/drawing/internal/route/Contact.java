package earward.drawing.internal.route;

import earward.drawing.internal.form.Side;

/**
 * A place where a wire of a net must arrive.
 *
 * @param cell where
 * @param side the way it points, out of its symbol
 */
record Contact(int cell, Side side) {}

package earward.desktop.view;

import earward.desktop.model.LevelCard;
import java.awt.Rectangle;

/**
 * One place of the level diagram at which a walk stops.
 *
 * @param id what it selects, or the role that a ghost wants
 * @param kind what stands there
 * @param box where
 * @param seam whether it is a seam rather than a card
 * @param says in words
 */
record PathStop(String id, LevelCard.Kind kind, Rectangle box, boolean seam, String says) {
  boolean ghost() {
    return kind == LevelCard.Kind.GHOST;
  }
}

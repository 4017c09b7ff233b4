package earward.sheet.internal.page;

import java.util.Optional;

/** Something that stands on one page, as wide as the content. */
public interface Piece {
  /** Its height in points at the width. */
  float height(float width);

  /** Draws it with its upper left corner at x and y. */
  void draw(Canvas canvas, float x, float y, float width);

  /** Space above it, left out at the top of a page. */
  default float spaceAbove() {
    return 0;
  }

  /** Whether it must stand on the same page as the piece after it. */
  default boolean keptWithNext() {
    return false;
  }

  /**
   * The pieces after it that should stand on its page where one page can hold them all: the rest of
   * its section.
   */
  default int together() {
    return 0;
  }

  /** Whether it begins a page. */
  default boolean beginsPage() {
    return false;
  }

  /** What is repeated above it where it begins a page in the midst of its table. */
  default Optional<Piece> repeatedAbove() {
    return Optional.empty();
  }

  /** Its entry in the list of bookmarks. */
  default Optional<String> bookmark() {
    return Optional.empty();
  }
}

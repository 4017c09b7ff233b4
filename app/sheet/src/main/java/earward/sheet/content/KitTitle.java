package earward.sheet.content;

import java.util.Objects;

/**
 * Which kit the sheet is for; printed on the cover and at the foot of every page.
 *
 * @param name of the kit
 * @param revision of its design
 * @param digest of its design, short form
 * @param clubName who hands it out; may be empty
 * @param kitNumber the maker's own number; may be empty
 */
public record KitTitle(
    String name, String revision, String digest, String clubName, String kitNumber) {
  public KitTitle {
    if (name.isBlank()) {
      throw new IllegalArgumentException("the kit has no name");
    }
    Objects.requireNonNull(revision);
    Objects.requireNonNull(digest);
    Objects.requireNonNull(clubName);
    Objects.requireNonNull(kitNumber);
  }
}

package earward.desktop.model;

import java.util.Objects;

/**
 * Where work is done beside the event thread; work in one lane does not hold up the others.
 *
 * @param quick headline figures
 * @param thorough the whole review
 * @param late remedies, curves and proposals
 * @param live values at the test points in the case that is looked at
 * @param pages drawings and pages
 * @param asked what the user asked for and waits for: offers, proposals, exports
 */
public record Lanes(
    Background quick,
    Background thorough,
    Background late,
    Background live,
    Background pages,
    Background asked) {
  public Lanes {
    Objects.requireNonNull(quick);
    Objects.requireNonNull(thorough);
    Objects.requireNonNull(late);
    Objects.requireNonNull(live);
    Objects.requireNonNull(pages);
    Objects.requireNonNull(asked);
  }

  /** All work in one lane, for tests that decide when it runs. */
  public static Lanes single(Background one) {
    return new Lanes(one, one, one, one, one, one);
  }
}

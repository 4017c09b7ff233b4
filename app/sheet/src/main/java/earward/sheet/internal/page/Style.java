package earward.sheet.internal.page;

import java.util.Objects;

/**
 * How text is set.
 *
 * @param size in points, never below {@value #LEAST_POINTS}
 * @param weight of the letters
 * @param tone of the ink
 */
public record Style(float size, Weight weight, Tone tone) {
  /** Text is never smaller than this on paper. */
  public static final float LEAST_POINTS = 7;

  public static final Style DISPLAY = new Style(30, Weight.BOLD, Tone.INK);
  public static final Style HEADING = new Style(13, Weight.BOLD, Tone.INK);
  public static final Style LEAD = new Style(10.5f, Weight.REGULAR, Tone.INK);
  public static final Style BODY = new Style(9, Weight.REGULAR, Tone.INK);
  public static final Style STRONG = new Style(9, Weight.BOLD, Tone.INK);
  public static final Style CLOSE = new Style(8.5f, Weight.REGULAR, Tone.INK);
  public static final Style NOTE = new Style(8, Weight.REGULAR, Tone.DARK);
  public static final Style LABEL = new Style(7.5f, Weight.REGULAR, Tone.DARK);
  public static final Style LABEL_STRONG = new Style(7.5f, Weight.BOLD, Tone.INK);
  public static final Style PRINT = new Style(7, Weight.REGULAR, Tone.INK);
  public static final Style PRINT_STRONG = new Style(7, Weight.BOLD, Tone.INK);

  private static final float LEADING = 1.28f;

  /** The two weights of the sheet. */
  public enum Weight {
    REGULAR,
    BOLD
  }

  /** Grey steps that stay legible on a poor printer. */
  public enum Tone {
    INK(0x00),
    DARK(0x48),
    MIDDLE(0x8c),
    HAIR(0xb4),
    TINT(0xee),
    PAPER(0xff);

    private final int grey;

    Tone(int grey) {
      this.grey = grey;
    }

    /** 0 for black to 255 for paper. */
    public int grey() {
      return grey;
    }
  }

  public Style {
    Objects.requireNonNull(weight);
    Objects.requireNonNull(tone);
    if (!(size >= LEAST_POINTS)) {
      throw new IllegalArgumentException(
          "text of " + size + " pt; the sheet has none below " + LEAST_POINTS + " pt");
    }
  }

  /** From baseline to baseline. */
  public float leading() {
    return size * LEADING;
  }

  /** From the top of a line to its baseline. */
  public float rise() {
    return size * 0.96f;
  }

  /** The same in another tone. */
  public Style in(Tone changed) {
    return new Style(size, weight, changed);
  }

  /** The same in bold. */
  public Style strong() {
    return new Style(size, Weight.BOLD, tone);
  }
}

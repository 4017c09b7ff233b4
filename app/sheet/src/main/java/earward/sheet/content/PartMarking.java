package earward.sheet.content;

import earward.kit.parts.BandColour;
import java.util.List;
import java.util.Objects;

/** What the builder sees on a part, and so what the sheet draws beside it. */
public sealed interface PartMarking {

  /**
   * Rings of a resistor.
   *
   * @param colours as they are read, three to five; the tolerance last where there is one
   * @param code the value with a letter for its decimal sign, for instance 4K7
   */
  record Bands(List<BandColour> colours, String code) implements PartMarking {
    public Bands {
      colours = List.copyOf(colours);
      if (colours.size() < 3 || colours.size() > 5 || code.isBlank()) {
        throw new IllegalArgumentException(
            "a resistor has three to five bands and a code, not " + colours + " '" + code + "'");
      }
    }
  }

  /**
   * A print on a body of a known shape.
   *
   * @param body the shape
   * @param print what is drawn on it, short
   * @param inWords what is printed, and what may be printed instead
   */
  record Printed(Body body, String print, String inWords) implements PartMarking {
    public Printed {
      Objects.requireNonNull(inWords);
      if (print.isBlank()) {
        throw new IllegalArgumentException("nothing is printed on the " + body);
      }
    }
  }

  /** Nothing that could be drawn. */
  record Unmarked() implements PartMarking {}

  /** The shapes of bodies that are drawn. */
  enum Body {
    /** A box on two wires. */
    FILM_CAPACITOR,
    /** A disc on two wires. */
    CERAMIC_CAPACITOR,
    /** A can with a stripe at its negative wire. */
    ELECTROLYTIC_CAPACITOR,
    /** A sleeve with a ring at its cathode. */
    DIODE,
    /** Seen from above, notch to the left. */
    INTEGRATED_CIRCUIT,
    /** Anything else: a plain box. */
    OTHER
  }
}

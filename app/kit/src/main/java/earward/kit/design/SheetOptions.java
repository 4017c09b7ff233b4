package earward.kit.design;

import java.util.Objects;

/**
 * How the build sheet is to look.
 *
 * @param paper its size
 * @param language tag of the wording, for instance {@code en}
 * @param clubName who hands the kit out; may be empty
 * @param kitNumber the maker's own number of the kit; may be empty
 * @param density how close the drawing stands
 * @param written how the file had it
 */
public record SheetOptions(
    Paper paper,
    String language,
    String clubName,
    String kitNumber,
    Density density,
    AsWritten written) {
  /** A4, English, roomy. */
  public static final SheetOptions USUAL =
      new SheetOptions(Paper.A4, "en", "", "", Density.ROOMY, AsWritten.NEW);

  /** Paper sizes, in points of 1/72 inch. */
  public enum Paper {
    A4("A4", 595.28, 841.89),
    LETTER("Letter", 612, 792);

    private final String key;
    private final double widthPoints;
    private final double heightPoints;

    Paper(String key, double widthPoints, double heightPoints) {
      this.key = key;
      this.widthPoints = widthPoints;
      this.heightPoints = heightPoints;
    }

    /** The size as written in files. */
    public String key() {
      return key;
    }

    /** Width, upright. */
    public double widthPoints() {
      return widthPoints;
    }

    /** Height, upright. */
    public double heightPoints() {
      return heightPoints;
    }
  }

  /** How close the parts of the drawing stand. */
  public enum Density {
    ROOMY("roomy"),
    CLOSE("close");

    private final String key;

    Density(String key) {
      this.key = key;
    }

    /** The density as written in files. */
    public String key() {
      return key;
    }
  }

  public SheetOptions {
    Objects.requireNonNull(paper);
    Objects.requireNonNull(clubName);
    Objects.requireNonNull(kitNumber);
    Objects.requireNonNull(density);
    Objects.requireNonNull(written);
    if (!language.matches("[a-z]{2,3}(-[A-Za-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "the sheet's language is '" + language + "'; wanted a tag such as en or de");
    }
  }

  /** These options on another paper. */
  public SheetOptions withPaper(Paper changed) {
    return new SheetOptions(changed, language, clubName, kitNumber, density, written);
  }
}

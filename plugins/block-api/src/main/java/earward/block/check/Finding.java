package earward.block.check;

import earward.block.figure.FigureName;
import java.util.Objects;
import java.util.Optional;

/**
 * The outcome of a check, of a load, of a solve or of a command: the one shape in which anything is
 * found wrong or worth knowing.
 *
 * @param severity what it weighs
 * @param code stable, lower case with hyphens
 * @param subject what it is about: a block's id, a plug-in's file name, a place in a file
 * @param sentence one sentence that names the thing, what was found and what is wanted
 * @param source where the limit comes from; empty where there is none
 * @param measured the figure behind it, where there is one
 */
public record Finding(
    Severity severity,
    String code,
    String subject,
    String sentence,
    String source,
    Optional<Measured> measured) {

  /**
   * The figure behind a finding.
   *
   * @param figure its name, with the block's id
   * @param value what was found
   * @param limit what was wanted
   */
  public record Measured(FigureName figure, double value, double limit) {}

  public Finding {
    Objects.requireNonNull(severity);
    Objects.requireNonNull(subject);
    Objects.requireNonNull(source);
    Objects.requireNonNull(measured);
    if (code.isBlank() || sentence.isBlank()) {
      throw new IllegalArgumentException("a finding has a code and a sentence");
    }
  }

  /**
   * A finding of a block's own judgement, said in the words of the block's text {@code
   * finding.CODE}.
   */
  public static Finding inWords(Severity severity, String code) {
    return of(severity, code, "", textKey(code));
  }

  /** The key of the text that says a finding of this code. */
  public static String textKey(String code) {
    return "finding." + code;
  }

  /** A finding without a figure. */
  public static Finding of(Severity severity, String code, String subject, String sentence) {
    return new Finding(severity, code, subject, sentence, "", Optional.empty());
  }
}

package earward.sheet.wording;

/** A wording file that cannot be used, in one sentence that names the file. */
public final class WordingException extends Exception {
  private static final long serialVersionUID = 1;

  /** With its sentence. */
  public WordingException(String sentence) {
    super(sentence);
  }
}

package earward.study.diagnosis;

/** Readings that cannot be used, with one sentence that says why and where. */
public final class ReadingsException extends Exception {
  private static final long serialVersionUID = 1L;

  ReadingsException(String sentence) {
    super(sentence);
  }

  /** The sentence. */
  public String sentence() {
    return String.valueOf(getMessage());
  }
}

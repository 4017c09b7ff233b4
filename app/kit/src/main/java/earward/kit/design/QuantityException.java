package earward.kit.design;

/** Words that are no quantity of the wanted unit; the message is one sentence for the user. */
public final class QuantityException extends Exception {
  private static final long serialVersionUID = 1L;

  /** With one sentence that names the found and the wanted. */
  public QuantityException(String sentence) {
    super(sentence);
  }

  /** The sentence. */
  public String sentence() {
    return String.valueOf(getMessage());
  }
}

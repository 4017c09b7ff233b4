package earward.kit.parts;

/** A setting that cannot be read; the message is one sentence for the user. */
public final class SettingException extends Exception {
  private static final long serialVersionUID = 1L;
  private final String code;

  /**
   * With a stable code and one sentence.
   *
   * @param code lower case with hyphens
   * @param sentence names block, setting, found and wanted
   */
  public SettingException(String code, String sentence) {
    super(sentence);
    this.code = code;
  }

  /** The stable code. */
  public String code() {
    return code;
  }

  /** The sentence. */
  public String sentence() {
    return String.valueOf(getMessage());
  }
}

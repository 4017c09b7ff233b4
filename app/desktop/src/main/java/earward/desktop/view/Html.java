package earward.desktop.view;

/** Text in labels that wrap. */
final class Html {
  private Html() {}

  static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }

  /** Text in lines of a width. */
  static String wrapped(String text, int width) {
    return "<html><p width=" + width + ">" + escaped(text);
  }
}

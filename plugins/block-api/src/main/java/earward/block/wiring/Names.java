package earward.block.wiring;

/** The rule for local names. */
final class Names {
  private Names() {}

  static void require(String name, String what) {
    if (!name.matches("[A-Za-z0-9]+(-[A-Za-z0-9]+)*")) {
      throw new IllegalArgumentException(
          what + " is named '" + name + "'; wanted letters, digits and single hyphens");
    }
  }
}

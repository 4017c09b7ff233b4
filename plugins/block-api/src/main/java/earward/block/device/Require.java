package earward.block.device;

/**
 * The argument checks of the device records; each message names the thing, the found, the wanted.
 */
final class Require {
  private Require() {}

  static void above(double least, double value, String what) {
    if (!(value > least)) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be above " + least);
    }
  }

  /** Above 0 and no more than any part has. */
  static void positive(double most, double value, String what) {
    above(0, value, what);
    atMost(most, value, what);
  }

  /** At least 0 and no more than any part has. */
  static void notNegative(double most, double value, String what) {
    atLeast(0, value, what);
    atMost(most, value, what);
  }

  static void atMost(double most, double value, String what) {
    if (value > most) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be at most " + most);
    }
  }

  static void atLeast(double least, double value, String what) {
    if (!(value >= least)) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be at least " + least);
    }
  }

  static void within(double least, double most, double value, String what) {
    if (!(value >= least && value <= most)) {
      throw new IllegalArgumentException(
          what + " is " + value + "; it must be from " + least + " to " + most);
    }
  }

  static void named(String name, String what) {
    if (name.isBlank()) {
      throw new IllegalArgumentException(what + " has no name");
    }
  }
}

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

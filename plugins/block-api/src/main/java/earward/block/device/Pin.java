package earward.block.device;

/**
 * One pin of a package.
 *
 * @param number as printed in the data sheet, from 1
 * @param terminal what the pin is
 */
public record Pin(int number, Terminal terminal) {
  public Pin {
    if (number < 1) {
      throw new IllegalArgumentException("a pin number is at least 1, found " + number);
    }
  }
}

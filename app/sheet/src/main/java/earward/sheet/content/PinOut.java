package earward.sheet.content;

import java.util.List;

/**
 * The pins of an integrated circuit and where each leads.
 *
 * @param reference for instance IC1
 * @param type the part type
 * @param packageName for instance DIP-8; may be empty
 * @param pins by rising number
 */
public record PinOut(String reference, String type, String packageName, List<PinRow> pins) {

  /**
   * One pin.
   *
   * @param number as in the data sheet
   * @param function what the pin is, in words
   * @param leadsTo what it is joined to; empty where it stays open
   */
  public record PinRow(int number, String function, String leadsTo) {}

  public PinOut {
    pins = List.copyOf(pins);
    if (reference.isBlank() || pins.isEmpty()) {
      throw new IllegalArgumentException("a pin-out has a reference and pins");
    }
  }
}

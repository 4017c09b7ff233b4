package earward.block.quantity;

/** The unit in which a number is held; always the SI base or derived unit, never a multiple. */
public enum Unit {
  OHM("Ω"),
  FARAD("F"),
  HENRY("H"),
  VOLT("V"),
  AMPERE("A"),
  WATT("W"),
  HERTZ("Hz"),
  SECOND("s"),
  METRE("m"),
  AMPERE_HOUR("Ah"),
  HOUR("h"),
  /** Temperature in degrees Celsius. */
  CELSIUS("°C"),
  /** Thermal resistance. */
  KELVIN_PER_WATT("K/W"),
  DECIBEL("dB"),
  /** A share of one, shown in per cent: 0.3 is shown as 30 %. */
  FRACTION("%"),
  /** A plain number. */
  NUMBER("");

  private final String symbol;

  Unit(String symbol) {
    this.symbol = symbol;
  }

  /** The symbol as printed, for instance {@code Ω}; empty for a plain number. */
  public String symbol() {
    return symbol;
  }
}

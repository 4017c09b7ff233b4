package earward.block.wiring;

/** The hazards for which the sheet has a wording; a block says which of its parts carry them. */
public enum Caution {
  HOT_PART,
  POLARITY,
  CAPACITOR_DISCHARGE,
  BATTERY_SHORT,
  LITHIUM_IN_HOLDER,
  ADAPTOR_VOLTAGE,
  BRIDGE_NEVER_TO_GROUND,
  GLASS_DIODE,
  GERMANIUM_HEAT,
  HEARING,
  STATIC_DISCHARGE,
  OUTDOOR_AERIAL
}

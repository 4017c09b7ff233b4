package earward.block.wiring;

/**
 * The hazards for which the sheet has a wording; a block says which of its parts carry them. Where
 * a hazard depends on a setting, call {@link WiringPlan#caution} only when it is there. The
 * contract test asks for those marked "wanted"; the others are the block author's judgement.
 */
public enum Caution {
  /** May burn a finger: wanted of amplifier ICs and regulators; apt for warm transistors. */
  HOT_PART,
  /** Bursts when reversed: wanted of polarised capacitors, {@code dielectric().polarised()}. */
  POLARITY,
  /** Holds a charge after switching off: apt for large capacitors at a rail or an output. */
  CAPACITOR_DISCHARGE,
  /** Burns when shorted: wanted of batteries. */
  BATTERY_SHORT,
  /** Lithium cells would fit and give too much: apt for holders of AA cells. */
  LITHIUM_IN_HOLDER,
  /** Gives more than it says: wanted of adaptors. */
  ADAPTOR_VOLTAGE,
  /** Neither output may touch ground: wanted of bridge amplifiers, {@code model().bridge()}. */
  BRIDGE_NEVER_TO_GROUND,
  /** Breaks when its wires are bent at the glass: apt for glass diodes. */
  GLASS_DIODE,
  /** Dies of a slow iron: wanted of diodes whose {@code model().material()} is GERMANIUM. */
  GERMANIUM_HEAT,
  /** May be too loud: apt for loudspeakers and headphones. */
  HEARING,
  /** Dies of static electricity: wanted of field-effect transistors. */
  STATIC_DISCHARGE,
  /** Leads outside, to lightning: apt for what stands for the receiver's front end. */
  OUTDOOR_AERIAL
}

package earward.engine.law;

/** A part whose junction is known by its heat and one thermal resistance to the air. */
public interface Heated {
  /** Junction to still air, in K/W. */
  double junctionToAirKelvinPerWatt();
}

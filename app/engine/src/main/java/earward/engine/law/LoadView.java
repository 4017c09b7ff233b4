package earward.engine.law;

/** How a loudspeaker appears to the circuit. */
public enum LoadView {
  /** By Thiele and Small. */
  AS_IT_IS,
  /** As its rated resistance: for stated output powers. */
  RATED,
  /** As its DC resistance less its tolerance: for heat. */
  LEAST
}

package earward.engine;

/** What drives the circuit in a case. */
public enum Drive {
  /** No supply, no carrier. */
  UNPOWERED,
  /** Supply on, no carrier. */
  NO_SIGNAL,
  /** The carrier of the case's slots. */
  SIGNAL,
  /** Each amplifier at the edge of clipping at the tone, whatever drives it. */
  CLIPPING,
  /** The worst over all drives from silence to a square wave, into the least load. */
  ANY_DRIVE
}

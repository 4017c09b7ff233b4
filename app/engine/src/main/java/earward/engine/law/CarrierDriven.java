package earward.engine.law;

import earward.engine.detection.PortLaw;

/**
 * A part that the carrier may drive. While the carrier is on, a driven one stands as sources of its
 * mean currents to DC and as nothing at all to audio and carrier: its cycle is solved apart.
 */
public interface CarrierDriven {
  /** How many ports it has, 1 or 2. */
  int ports();

  /** Place of its first port among all carrier-driven ones, −1 for a part that is not driven. */
  int driven();

  /** Unknown at which a current into a port begins, −1 for ground. */
  int anode(DirectStage stage, int port);

  /** Unknown at which it ends. */
  int cathode(DirectStage stage, int port);

  /** Resistance between a port and its junction, in Ω. */
  double seriesOhms(DirectStage stage, int port);

  /**
   * Noise of its first port alone, in A²/Hz, by the mean current that leaves or enters there.
   *
   * @param amperes mean, in A
   * @param volts mean across the junction, in V
   */
  double portNoise(DirectStage stage, double amperes, double volts);

  /** Noise between the outer ends of its two ports, in A²/Hz, by the mean current there. */
  double acrossNoise(DirectStage stage, double amperes);

  /** A law of its ports for one thread, to be filled before each solve. */
  PortLaw portLaw(DirectStage stage);

  /** Takes over values and temperature of a case. */
  void fill(DirectStage stage, PortLaw law);
}

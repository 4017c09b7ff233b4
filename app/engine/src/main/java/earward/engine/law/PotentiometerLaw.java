package earward.engine.law;

import earward.block.device.Taper;

/**
 * A track with a wiper and perhaps a tap; terminals TOP, WIPER, BOTTOM, TAP. Which of wiper and tap
 * is the upper one is a matter of values: all pairs of ends that may be neighbours are stamped,
 * some with nothing between them.
 */
final class PotentiometerLaw extends Law {
  private static final int TRACK_OHMS = 0;
  private static final int AT_HALF = 1;
  private static final int END_OHMS = 2;
  private static final int POSITION = 3;
  private static final int TAP_FRACTION = 4;

  /** Ends of the pieces of track; the first two are all there is without a tap. */
  private static final int[][] PIECES = {{0, 1}, {1, 2}, {0, 3}, {3, 2}, {1, 3}};

  private final boolean tapped;
  private final int pieces;

  PotentiometerLaw(Seat seat, boolean tapped) {
    super(seat);
    this.tapped = tapped;
    pieces = tapped ? PIECES.length : 2;
  }

  /** Conductance of a piece, in S; 0 for one that lies apart. */
  private static double siemens(
      int piece, double track, double end, double below, double tapBelow, boolean tapped) {
    boolean wiperAbove = !tapped || below >= tapBelow;
    double share =
        switch (piece) {
          case 0 -> wiperAbove ? 1 - below : Double.NaN;
          case 1 -> tapped && wiperAbove ? Double.NaN : below;
          case 2 -> wiperAbove ? Double.NaN : 1 - tapBelow;
          case 3 -> wiperAbove ? tapBelow : Double.NaN;
          default -> Math.abs(below - tapBelow);
        };
    return Double.isNaN(share) ? 0 : 1 / Math.max(end, track * share);
  }

  private double siemens(int piece, DirectStage stage) {
    double tap = tapped ? value(stage, TAP_FRACTION) : 0;
    return siemens(
        piece,
        value(stage, TRACK_OHMS),
        Math.max(InductorLaw.LEAST_OHMS, value(stage, END_OHMS)),
        below(value(stage, POSITION), value(stage, AT_HALF)),
        tap,
        tapped);
  }

  private double siemens(int piece, AlternatingStage stage) {
    double tap = tapped ? value(stage, TAP_FRACTION) : 0;
    return siemens(
        piece,
        value(stage, TRACK_OHMS),
        Math.max(InductorLaw.LEAST_OHMS, value(stage, END_OHMS)),
        below(value(stage, POSITION), value(stage, AT_HALF)),
        tap,
        tapped);
  }

  private double siemens(int piece, WaveformStage stage) {
    double tap = tapped ? value(stage, TAP_FRACTION) : 0;
    return siemens(
        piece,
        value(stage, TRACK_OHMS),
        Math.max(InductorLaw.LEAST_OHMS, value(stage, END_OHMS)),
        below(value(stage, POSITION), value(stage, AT_HALF)),
        tap,
        tapped);
  }

  private static double below(double position, double atHalf) {
    return Taper.fractionBelowWiper(Math.min(1, Math.max(0, position)), atHalf);
  }

  @Override
  void stampDirect(DirectStage stage, int[] nodes) {
    for (int k = 0; k < pieces; k++) {
      stage.conductance(nodes[PIECES[k][0]], nodes[PIECES[k][1]], siemens(k, stage));
    }
  }

  @Override
  public boolean steady() {
    return true;
  }

  @Override
  void stampAlternating(AlternatingStage stage, int[] nodes) {
    for (int k = 0; k < pieces; k++) {
      stage.admittance(nodes[PIECES[k][0]], nodes[PIECES[k][1]], siemens(k, stage), 0);
    }
  }

  @Override
  void addNoise(NoiseStage noise, int[] nodes) {
    for (int k = 0; k < pieces; k++) {
      double siemens = siemens(k, noise.stage());
      if (siemens > 0) {
        noise.thermal(nodes[PIECES[k][0]], nodes[PIECES[k][1]], siemens);
      }
    }
  }

  @Override
  void stampWaveform(WaveformStage stage, int[] nodes) {
    for (int k = 0; k < pieces; k++) {
      stage.conductance(nodes[PIECES[k][0]], nodes[PIECES[k][1]], siemens(k, stage));
    }
  }

  @Override
  public double watts(DirectStage stage) {
    if (isOpen(stage)) {
      return 0;
    }
    double watts = 0;
    for (int k = 0; k < pieces; k++) {
      double volts = stage.volts(node(PIECES[k][0])) - stage.volts(node(PIECES[k][1]));
      watts += volts * volts * siemens(k, stage);
    }
    return watts;
  }
}

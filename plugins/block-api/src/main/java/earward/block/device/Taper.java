package earward.block.device;

/**
 * How a track's resistance grows with the turn: two straight lines that meet at half turn.
 *
 * <p>Resistance below the wiper at half turn: 50 % linear; 10, 15 or 20 % audio; the mirror image
 * reverse. Source: the two-line law of most carbon tracks, common practice; IEC 60393-1 gives the
 * framework only.
 */
public enum Taper {
  LINEAR(0.5),
  AUDIO_10(0.10),
  AUDIO_15(0.15),
  AUDIO_20(0.20),
  REVERSE_15(0.85);

  private final double fractionAtHalfTurn;

  Taper(double fractionAtHalfTurn) {
    this.fractionAtHalfTurn = fractionAtHalfTurn;
  }

  /** Share of the track below the wiper at half turn. */
  public double fractionAtHalfTurn() {
    return fractionAtHalfTurn;
  }

  /**
   * Share of the track's resistance below the wiper.
   *
   * @param position of the turn, from 0 (anticlockwise end) to 1
   * @throws IllegalArgumentException when the position is outside 0 to 1
   */
  public double fractionBelowWiper(double position) {
    return fractionBelowWiper(position, fractionAtHalfTurn);
  }

  /** The same law for a specimen whose share at half turn is given. */
  public static double fractionBelowWiper(double position, double fractionAtHalfTurn) {
    Require.within(0, 1, position, "position of the turn");
    return position <= 0.5
        ? 2 * position * fractionAtHalfTurn
        : fractionAtHalfTurn + (2 * position - 1) * (1 - fractionAtHalfTurn);
  }
}

package earward.kit.path;

import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import java.util.Objects;

/**
 * One figure both ways.
 *
 * @param place test point, or {@code path}
 * @param quantity what is read there
 * @param averaged by carrier-averaged detection, which all of the program's figures come from
 * @param full by the full waveform
 */
public record ProofRow(String place, Quantity quantity, double averaged, double full) {
  /** Share of a level by which the two may differ. */
  private static final double LEVEL = 1e-3;

  /** Share of the carrier's residue. */
  private static final double RESIDUE = 1e-2;

  /** By so much distortion may differ, as a fraction; above a tenth by a share of itself. */
  private static final double DISTORTION = 5e-4;

  private static final double HEAVY = 0.1;
  private static final double HEAVY_SHARE = 0.01;

  /** No meter of a builder's shows less, in V. */
  private static final double LEAST_VOLTS = 2e-5;

  public ProofRow {
    Objects.requireNonNull(place);
    Objects.requireNonNull(quantity);
  }

  /** Averaged less full, in the unit of the quantity. */
  public double difference() {
    return averaged - full;
  }

  /** By how much they may differ: 0.1 % of a level, 1 % of a residue, 0.05 points of distortion. */
  public double limit() {
    if (quantity == Quantity.DISTORTION) {
      return full > HEAVY ? HEAVY_SHARE * full : DISTORTION;
    }
    boolean level = quantity == Quantity.DC_VOLTS || quantity == Quantity.AUDIO_RMS_VOLTS;
    return Math.max(LEAST_VOLTS, (level ? LEVEL : RESIDUE) * Math.abs(full));
  }

  /** Whether they agree; so they do where neither is known. */
  public boolean agrees() {
    return (Double.isNaN(averaged) && Double.isNaN(full)) || Math.abs(difference()) <= limit();
  }

  /** Unit of both. */
  public Unit unit() {
    return quantity.unit();
  }
}

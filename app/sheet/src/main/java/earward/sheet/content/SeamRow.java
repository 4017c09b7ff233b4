package earward.sheet.content;

import java.util.Objects;

/**
 * Where two blocks meet, at the test signal.
 *
 * @param from name of the block on the left
 * @param to name of the block on the right
 * @param note what else must be said of it; may be empty
 * @param level audio rms there, carrier rms before the detector
 * @param distortion there
 * @param backward impedance seen towards the feed
 * @param onward impedance seen towards the load
 * @param loss by loading
 * @param headroom until something limits
 */
public record SeamRow(
    String from,
    String to,
    String note,
    Amount level,
    Amount distortion,
    Amount backward,
    Amount onward,
    Amount loss,
    Amount headroom) {
  public SeamRow {
    Objects.requireNonNull(from);
    Objects.requireNonNull(to);
    Objects.requireNonNull(note);
    Objects.requireNonNull(level);
    Objects.requireNonNull(distortion);
    Objects.requireNonNull(backward);
    Objects.requireNonNull(onward);
    Objects.requireNonNull(loss);
    Objects.requireNonNull(headroom);
  }
}

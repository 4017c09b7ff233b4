package earward.block.device;

/**
 * One point of the curve by which a DC voltage sets an amplifier's gain.
 *
 * @param controlVolts voltage at the control pin
 * @param gainDecibels gain relative to the model's own gain, at most 0 dB in most types
 */
public record ControlPoint(double controlVolts, double gainDecibels) {}

package earward.engine.law;

import earward.block.device.ControlPoint;
import java.util.List;

/**
 * A signal times what a control pin leaves of it over time. Controls: the signal, the pin over
 * ground; output: their product with the gain, which is linear in decibels between its points.
 */
final class ControlledSignal implements WaveformDevice {
  private final double[] volts;
  private final double[] decibels;

  ControlledSignal(List<ControlPoint> curve) {
    volts = curve.stream().mapToDouble(ControlPoint::controlVolts).toArray();
    decibels = curve.stream().mapToDouble(ControlPoint::gainDecibels).toArray();
  }

  @Override
  public int controls() {
    return 2;
  }

  @Override
  public int outputs() {
    return 1;
  }

  @Override
  public void evaluate(
      double[] controls, int at, double[] into, int outputAt, double[] slopes, int slopeAt) {
    double pin = controls[at + 1];
    int above = 0;
    while (above < volts.length && pin > volts[above]) {
      above++;
    }
    double here = decibels[Math.min(above, volts.length - 1)];
    double perVolt = 0;
    if (above > 0 && above < volts.length) {
      perVolt = (decibels[above] - decibels[above - 1]) / (volts[above] - volts[above - 1]);
      here = decibels[above - 1] + perVolt * (pin - volts[above - 1]);
    }
    double gain = Math.exp(Math.log(10) / 20 * here);
    into[outputAt] = gain * controls[at];
    slopes[slopeAt] = gain;
    slopes[slopeAt + 1] = Math.log(10) / 20 * perVolt * gain * controls[at];
  }

  @Override
  public double kneeVolts() {
    return 0.1;
  }
}

package earward.engine.waveform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import earward.engine.law.DirectStage;
import earward.engine.law.WaveformDevice;
import earward.engine.law.WaveformStage;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;

/** Single steps on circuits small enough to know: order, stiffness, kinks, garbage. */
class StepperTest {
  private static final double SLOW = 1e-3;

  private static WaveformStage stage() {
    return new WaveformStage(1, 1, new DirectStage(1, 1, 0, 0, 0), 1, 0, false);
  }

  /** A drive of one volt into R and C, stepped for one time constant. */
  private static double charged(int steps, double farads) {
    WaveformStage stage = stage();
    stage.conductance(0, -1, 1e-3);
    stage.drive(0, -1e-3);
    stage.capacitor(0, -1, farads, 0);
    Stepper stepper = new Stepper(new StepTables(new WaveformCircuit(stage), SLOW / steps));
    for (int i = 0; i < steps; i++) {
      assertThat(stepper.step(1, 1)).isTrue();
    }
    return stepper.s[0] / farads;
  }

  @Test
  void theErrorFallsWithTheThirdPowerOfTheStep() {
    double exact = 1 - Math.exp(-1);
    double coarse = Math.abs(charged(10, 1e-6) - exact);
    double fine = Math.abs(charged(20, 1e-6) - exact);

    assertThat(coarse / fine).isCloseTo(8, within(1.0));
  }

  /** A time constant of a ten-thousandth of the step dies out at once; trapezoids would ring. */
  @Test
  void whatIsStiffDoesNotRing() {
    assertThat(charged(10, 1e-11)).isCloseTo(1, within(1e-6));
    assertThat(charged(1, 1e-11)).isCloseTo(1, within(1e-3));
  }

  /** A diode of one kink, 1 S above 0 V, into 1 kΩ: v = e·1/(1 + 1e-3) or nothing. */
  @Test
  void aKinkConductsOnOneSideOnly() {
    WaveformStage stage = stage();
    stage.conductance(0, -1, 1e-3);
    stage.capacitor(0, -1, 1e-15, 0);
    int source = stage.unknown();
    stage.term(source, source, 1);
    stage.drive(source, -1);
    stage.kink().control(0, source, 1).control(0, 0, -1).output(0, 0, -1);
    Stepper stepper = new Stepper(new StepTables(new WaveformCircuit(stage), SLOW));

    assertThat(stepper.step(2, 2)).isTrue();
    assertThat(stepper.s[0] / 1e-15).isCloseTo(2 / 1.001, within(1e-6));
    assertThat(stepper.step(-2, -2)).isTrue();
    assertThat(stepper.s[0] / 1e-15).isCloseTo(0, within(1e-6));
  }

  @Test
  void steppingAllocatesNothing() {
    WaveformStage stage = stage();
    stage.conductance(0, -1, 1e-5);
    stage.capacitor(0, -1, 1e-9, 0);
    int source = stage.unknown();
    stage.term(source, source, 1);
    stage.drive(source, -1);
    stage.device(new Exponential()).control(0, source, 1).control(0, 0, -1).output(0, 0, -1);
    stage.kink().control(0, 0, 1e-6).output(0, 0, 1);
    Stepper stepper = new Stepper(new StepTables(new WaveformCircuit(stage), 1e-8));
    run(stepper, 20_000);
    ThreadMXBean bean = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    long before = bean.getCurrentThreadAllocatedBytes();
    run(stepper, 20_000);
    long bytes = bean.getCurrentThreadAllocatedBytes() - before;

    assertThat(bytes).as("bytes in 20 000 steps").isLessThan(4096);
    assertThat(stepper.s[0]).isPositive();
  }

  private static void run(Stepper stepper, int steps) {
    boolean all = true;
    for (int i = 0; i < steps; i++) {
      all &= stepper.step(Math.sin(0.06 * i), Math.sin(0.06 * i + 0.04));
    }
    assertThat(all).isTrue();
  }

  /** 1e-8 A times exp(u/26 mV), less one. */
  private static final class Exponential implements WaveformDevice {
    @Override
    public int controls() {
      return 1;
    }

    @Override
    public int outputs() {
      return 1;
    }

    @Override
    public void evaluate(double[] u, int at, double[] into, int out, double[] slopes, int slope) {
      double e = 1e-8 * Math.exp(Math.min(60, u[at] / 0.026));
      into[out] = e - 1e-8;
      slopes[slope] = e / 0.026;
    }

    @Override
    public double limited(int control, double from, double to) {
      return to > 0.4 && to - from > 0.05 ? from + 0.05 : to;
    }

    @Override
    public double kneeVolts() {
      return 0.026;
    }
  }
}

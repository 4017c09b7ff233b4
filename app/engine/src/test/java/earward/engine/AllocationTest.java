package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import earward.block.device.OutputSwing;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.lang.management.ManagementFactory;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** A solver works in the room that it was given: a batch makes no garbage, kit by kit. */
class AllocationTest {
  private static final int WARM_UP = 12;
  private static final int COUNTED = 12;

  @Test
  void solvingAllocatesNothing() {
    CompiledCircuit compiled =
        new TrialCircuit()
            .tuned(12e3, 40, "in")
            .diode("detector.d1", 1e-7, 1.05, 20, "in", "a")
            .capacitor("detector.c1", 1.5e-9, "a", Circuit.GROUND)
            .resistor("detector.r1", 22e3, "a", Circuit.GROUND)
            .capacitor("volume.cc", 220e-9, "a", "w")
            .resistor("volume.r", 47e3, "w", Circuit.GROUND)
            .battery(9, 2, "rail-main")
            .amplifier(false, 4e-3, new OutputSwing(1, 0.5, 0.5, 0.5, 0), "w", "rail-main")
            .capacitor("power.c", 470e-6, "plus", "out")
            .resistor("load.r", 8, "out", Circuit.GROUND)
            .signal(1.5, 0.3, 400)
            .solved(CaseName.FULL_OUTPUT, Drive.CLIPPING, Map.of())
            .solved(CaseName.HOTTEST, Drive.ANY_DRIVE, Map.of())
            .want("a", Quantity.DC_VOLTS)
            .want("out", Quantity.AUDIO_RMS_VOLTS)
            .want("out", Quantity.DISTORTION)
            .want("out", Quantity.CARRIER_RMS_VOLTS)
            .want("w", Quantity.LOW_EDGE_HERTZ)
            .want("w", Quantity.NOISE_RMS_VOLTS)
            .want("out", Quantity.A_WEIGHTED_NOISE_RMS_VOLTS)
            .want("detector.d1", Quantity.CLIPPING_DEPTH)
            .want("detector.d1", Quantity.CLEAN_DEPTH)
            .want("power.amplifier", Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT)
            .want("power.amplifier", Quantity.JUNCTION_CELSIUS, CaseName.HOTTEST)
            .compile();
    Solver solver = compiled.newSolver();
    double[] values = compiled.nominalValues();
    double[] figures = new double[compiled.figures().size()];
    for (int i = 0; i < WARM_UP; i++) {
      values[compiled.slot("detector.r1:ohms")] = 22e3 + i;
      assertThat(solver.solve(values, figures).solved()).isTrue();
    }
    ThreadMXBean bean = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    int slot = compiled.slot("detector.r1:ohms");
    boolean solved = true;
    long before = bean.getCurrentThreadAllocatedBytes();
    for (int i = 0; i < COUNTED; i++) {
      values[slot] = 22e3 - i;
      solved &= solver.solve(values, figures).solved();
    }
    long bytes = bean.getCurrentThreadAllocatedBytes() - before;
    assertThat(solved).isTrue();
    // one row of a matrix would be more; what is left is the virtual machine's own
    assertThat(bytes / COUNTED).as("bytes a solve").isLessThan(256);
  }
}

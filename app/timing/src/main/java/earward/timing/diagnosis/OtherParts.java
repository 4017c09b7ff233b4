package earward.timing.diagnosis;

import earward.block.device.AudioAmplifier;
import earward.block.device.Diode;
import earward.engine.CircuitPart;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;

/** Diodes and amplifiers that are not as the parts library assumes. */
final class OtherParts {
  private OtherParts() {}

  /** By what each slot of a kit's diodes and amplifiers is multiplied. */
  static Map<String, Double> factors(List<CircuitPart> parts, SplittableRandom random) {
    Map<String, Double> factors = new HashMap<>();
    for (CircuitPart part : parts) {
      if (part.device() instanceof Diode) {
        factors.put(part.name() + ":saturation-amperes", factor(random, 2));
        factors.put(part.name() + ":emission-coefficient", factor(random, 1.04));
        factors.put(part.name() + ":series-ohms", factor(random, 2));
      } else if (part.device() instanceof AudioAmplifier) {
        factors.put(part.name() + ":gain", factor(random, 1.15));
        factors.put(part.name() + ":feedback-ohms", factor(random, 1.15));
        factors.put(part.name() + ":quiescent-amperes", factor(random, 1.4));
        factors.put(part.name() + ":rest-fraction", factor(random, 1.02));
        factors.put(part.name() + ":input-ohms", factor(random, 1.3));
      }
    }
    return factors;
  }

  /** Evenly in the logarithm from 1/most to most. */
  private static double factor(SplittableRandom random, double most) {
    return Math.pow(most, 2 * random.nextDouble() - 1);
  }
}

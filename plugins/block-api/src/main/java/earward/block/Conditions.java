package earward.block;

/**
 * What the kit must work under and what is wanted of it, as far as a block may need it.
 *
 * @param carrierHertz carrier at the detector
 * @param toneHertz test tone, at most the highest one
 * @param highestToneHertz upper end of the audio band
 * @param lowestToneHertz lower end of the audio band
 * @param testDepth modulation depth of the test signal, from 0 to 1
 * @param deepestDepth deepest modulation to be followed, from 0 to 1
 * @param weakPeakVolts no-load carrier peak of the weakest station wanted
 * @param testPeakVolts no-load carrier peak of the test signal
 * @param strongPeakVolts no-load carrier peak of the strongest station
 * @param ambientCelsius usual ambient
 * @param highestAmbientCelsius highest ambient
 * @param wantedWatts output wanted into the rated load
 */
public record Conditions(
    double carrierHertz,
    double toneHertz,
    double highestToneHertz,
    double lowestToneHertz,
    double testDepth,
    double deepestDepth,
    double weakPeakVolts,
    double testPeakVolts,
    double strongPeakVolts,
    double ambientCelsius,
    double highestAmbientCelsius,
    double wantedWatts) {
  /** Far beyond any receiver kit; what is said to be more is a slip of the pen. */
  private static final double MOST_HERTZ = 1e9;

  private static final double MOST_VOLTS = 1e3;
  private static final double MOST_WATTS = 1e4;

  public Conditions {
    requireOrdered(0, lowestToneHertz, "lowest tone (Hz)");
    requireAtMost(MOST_HERTZ, carrierHertz, "carrier (Hz)");
    requireAtMost(MOST_VOLTS, weakPeakVolts, "weak carrier (V peak)");
    requireAtMost(MOST_VOLTS, testPeakVolts, "test carrier (V peak)");
    requireAtMost(MOST_VOLTS, strongPeakVolts, "strong carrier (V peak)");
    requireAtMost(MOST_WATTS, wantedWatts, "output wanted (W)");
    requireOrdered(lowestToneHertz, highestToneHertz, "highest tone (Hz)");
    requireOrdered(0, toneHertz, "test tone (Hz)");
    if (toneHertz > highestToneHertz) {
      throw new IllegalArgumentException(
          "test tone (Hz) is "
              + toneHertz
              + "; it must be at most the highest, "
              + highestToneHertz);
    }
    requireOrdered(highestToneHertz, carrierHertz, "carrier (Hz)");
    requireShare(testDepth, "test depth");
    requireShare(deepestDepth, "deepest depth");
    requireOrdered(0, weakPeakVolts, "weak carrier (V peak)");
    requireOrdered(0, testPeakVolts, "test carrier (V peak)");
    requireOrdered(0, strongPeakVolts, "strong carrier (V peak)");
    requireOrdered(ambientCelsius - 1e-9, highestAmbientCelsius, "highest ambient (°C)");
    requireOrdered(0, wantedWatts, "output wanted (W)");
  }

  private static void requireOrdered(double below, double value, String what) {
    if (!(value > below) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be above " + below);
    }
  }

  private static void requireAtMost(double most, double value, String what) {
    if (value > most) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be at most " + most);
    }
  }

  private static void requireShare(double value, String what) {
    if (!(value > 0 && value <= 1)) {
      throw new IllegalArgumentException(what + " is " + value + "; it must be above 0, at most 1");
    }
  }
}

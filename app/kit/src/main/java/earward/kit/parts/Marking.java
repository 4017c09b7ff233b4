package earward.kit.parts;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * How parts are marked.
 *
 * <p>Source: IEC 60062 (colours, letter codes, tolerance letters; lists from memory). Pure
 * functions; none knows the language in which a colour is printed.
 */
public final class Marking {
  /** Tolerance shares that have a band and letter of their own, from narrow to wide. */
  private static final Map<Double, BandColour> TOLERANCE_BANDS =
      Collections.unmodifiableMap(
          new TreeMap<>(
              Map.of(
                  0.01, BandColour.BROWN,
                  0.02, BandColour.RED,
                  0.005, BandColour.GREEN,
                  0.05, BandColour.GOLD,
                  0.10, BandColour.SILVER)));

  private static final Map<Double, String> TOLERANCE_LETTERS =
      Collections.unmodifiableMap(
          new TreeMap<>(
              Map.of(
                  0.005, "D", 0.01, "F", 0.02, "G", 0.03, "H", 0.05, "J", 0.10, "K", 0.20, "M")));

  private static final double SAME = 1e-6;

  private Marking() {}

  /**
   * The colour bands of a resistor: three significant bands at 2 % and below, else two; then the
   * multiplier and the tolerance, which has no band at 20 %.
   *
   * @param ohms from 0.1 Ω to below 100 GΩ
   * @param toleranceFraction share to both sides
   * @return empty where the value has more digits than bands or the tolerance has no colour
   */
  public static Optional<List<BandColour>> colourBands(double ohms, double toleranceFraction) {
    Optional<BandColour> tolerance = toleranceBand(toleranceFraction);
    boolean unmarked = same(toleranceFraction, 0.20);
    if (!(ohms > 0) || Double.isInfinite(ohms) || (tolerance.isEmpty() && !unmarked)) {
      return Optional.empty();
    }
    int digits = toleranceFraction < 0.03 ? 3 : 2;
    BigDecimal exact = new BigDecimal(Double.toString(ohms));
    BigDecimal rounded = exact.round(new MathContext(digits, RoundingMode.HALF_UP));
    int exponent = rounded.precision() - rounded.scale() - digits;
    if (!same(rounded.doubleValue() / ohms, 1) || exponent < -3 || exponent > 9) {
      return Optional.empty();
    }
    String figures = rounded.scaleByPowerOfTen(-exponent).toBigInteger().toString();
    List<BandColour> bands = new ArrayList<>();
    figures.chars().forEach(digit -> bands.add(BandColour.ofDigit(digit - '0')));
    bands.add(BandColour.ofExponent(exponent));
    tolerance.ifPresent(bands::add);
    return Optional.of(List.copyOf(bands));
  }

  private static Optional<BandColour> toleranceBand(double fraction) {
    return lookUp(TOLERANCE_BANDS, fraction);
  }

  /** The letter of a symmetrical tolerance: J for 5 %; empty where it has none. */
  public static Optional<String> toleranceLetter(double fraction) {
    return lookUp(TOLERANCE_LETTERS, fraction);
  }

  /** The letter of an absolute tolerance of a capacitor below 10 pF: B, C or D. */
  public static Optional<String> picofaradLetter(double toleranceFarads) {
    return lookUp(Map.of(0.1, "B", 0.25, "C", 0.5, "D"), toleranceFarads * 1e12);
  }

  /** The letter of an uneven tolerance, shares below and above: Q for -10 % / +30 %. */
  public static Optional<String> unevenLetter(double below, double above) {
    Map<String, double[]> letters =
        Map.of(
            "Q", new double[] {0.10, 0.30},
            "S", new double[] {0.20, 0.50},
            "T", new double[] {0.10, 0.50},
            "Z", new double[] {0.20, 0.80});
    return letters.entrySet().stream()
        .filter(e -> same(e.getValue()[0], below) && same(e.getValue()[1], above))
        .map(Map.Entry::getKey)
        .findFirst();
  }

  private static <T> Optional<T> lookUp(Map<Double, T> table, double key) {
    return table.entrySet().stream()
        .filter(entry -> same(entry.getKey(), key))
        .map(Map.Entry::getValue)
        .findFirst();
  }

  private static boolean same(double a, double b) {
    return Math.abs(a - b) < SAME;
  }

  /**
   * A resistance with a letter for its decimal sign: R47, 4R7, 47R, 4K7, 1M0.
   *
   * @param ohms above 0
   */
  public static String resistorCode(double ohms) {
    return lettered(ohms, new int[] {0, 3, 6, 9}, new String[] {"R", "K", "M", "G"});
  }

  /**
   * A capacitance with a letter for its decimal sign: p33, 4n7, 100n, 2µ2.
   *
   * @param farads above 0
   */
  public static String capacitorLetters(double farads) {
    return lettered(farads, new int[] {-12, -9, -6, -3}, new String[] {"p", "n", "µ", "m"});
  }

  private static String lettered(double value, int[] exponents, String[] letters) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException("a marked value is above 0, found " + value);
    }
    BigDecimal exact =
        new BigDecimal(Double.toString(value)).round(new MathContext(4, RoundingMode.HALF_UP));
    int magnitude = exact.precision() - exact.scale() - 1;
    int index = 0;
    while (index + 1 < exponents.length && magnitude >= exponents[index + 1]) {
      index++;
    }
    BigDecimal number = exact.scaleByPowerOfTen(-exponents[index]).stripTrailingZeros();
    if (number.precision() - number.scale() == 1 && number.scale() <= 0) {
      number = number.setScale(1);
    }
    String[] halves = number.toPlainString().split("\\.", -1);
    String before = halves[0].equals("0") ? "" : halves[0];
    return before + letters[index] + (halves.length > 1 ? halves[1] : "");
  }

  /**
   * The three-digit code of a capacitor: two figures and the number of noughts in picofarads, 9 for
   * a tenth; below 10 pF with two figures the letter form is commoner, and both are read.
   *
   * @param farads from 1 pF to below 100 mF
   * @return empty where the value has more than two figures
   */
  public static Optional<String> capacitorCode(double farads) {
    BigDecimal picofarads = new BigDecimal(Double.toString(farads)).scaleByPowerOfTen(12);
    BigDecimal rounded = picofarads.round(new MathContext(2, RoundingMode.HALF_UP));
    if (!(farads > 0) || !same(rounded.doubleValue() / picofarads.doubleValue(), 1)) {
      return Optional.empty();
    }
    int exponent = rounded.precision() - rounded.scale() - 2;
    if (exponent < -1 || exponent > 8) {
      return Optional.empty();
    }
    String figures = rounded.scaleByPowerOfTen(-exponent).toBigInteger().toString();
    return Optional.of(figures + (exponent == -1 ? 9 : exponent));
  }

  /**
   * The capacitance of a code, in farads: three digits, or picofarads with R or a point for the
   * decimal sign ({@code 8R2}, {@code 8.2}).
   *
   * @throws IllegalArgumentException when it is neither
   */
  public static double capacitorFarads(String code) {
    if (code.matches("[0-9]{1,2}[R.][0-9]{1,2}")) {
      return new BigDecimal(code.replace('R', '.')).scaleByPowerOfTen(-12).doubleValue();
    }
    if (!code.matches("[0-9]{3}")) {
      throw new IllegalArgumentException(
          "'" + code + "' is no capacitor code: wanted three digits as 473, or picofarads as 8R2");
    }
    int last = code.charAt(2) - '0';
    int exponent = last == 9 ? -1 : last;
    return new BigDecimal(code.substring(0, 2)).scaleByPowerOfTen(exponent - 12).doubleValue();
  }
}

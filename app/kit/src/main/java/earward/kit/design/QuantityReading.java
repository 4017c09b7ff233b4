package earward.kit.design;

import earward.block.quantity.Unit;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads one quantity: a plain number, or one with a letter for its decimal sign (IEC 60062). */
final class QuantityReading {
  private static final int LONGEST = 60;
  private static final Pattern PLAIN =
      Pattern.compile("([+-]?)([0-9]+(?:[.,][0-9]*)?|[.,][0-9]+)([eE][+-]?[0-9]{1,3})?");
  private static final Pattern LETTERED =
      Pattern.compile("([+-]?)([0-9]*)([A-Za-zµΩ])([0-9]+)(?![.,0-9])");

  private final String text;
  private final String words;
  private final Unit unit;

  private QuantityReading(String text, Unit unit) {
    this.text = text.strip();
    this.words = normalised(this.text);
    this.unit = unit;
  }

  static double of(String text, Unit unit) throws QuantityException {
    return new QuantityReading(text, unit).read();
  }

  private double read() throws QuantityException {
    if (words.isEmpty()) {
      throw new QuantityException("nothing is written; wanted " + wanted());
    }
    if (words.length() > LONGEST) {
      throw new QuantityException(
          "'" + text.substring(0, 20) + "…' is too long for a quantity; wanted " + wanted());
    }
    Matcher lettered = LETTERED.matcher(words);
    if (lettered.lookingAt()) {
      Optional<Integer> exponent = decimalLetter(lettered.group(3).charAt(0));
      if (exponent.isPresent()) {
        String number = "0" + lettered.group(2) + "." + lettered.group(4);
        int tail = tailExponent(words.substring(lettered.end()).strip(), false);
        return finished(lettered.group(1), number, exponent.get() + tail);
      }
    }
    Matcher plain = PLAIN.matcher(words);
    if (!plain.lookingAt()) {
      throw new QuantityException("'" + text + "' is no number; wanted " + wanted());
    }
    String tail = words.substring(plain.end()).strip();
    if (!tail.isEmpty() && (".,".indexOf(tail.charAt(0)) >= 0 || isDigit(tail.charAt(0)))) {
      throw new QuantityException(
          "'"
              + text
              + "' is no number: one point or comma is the decimal sign, and thousands are not"
              + " separated; wanted "
              + wanted());
    }
    String number = "0" + plain.group(2).replace(',', '.');
    int shift = plain.group(3) == null ? 0 : Integer.parseInt(plain.group(3).substring(1));
    return finished(plain.group(1), number, shift + tailExponent(tail, true));
  }

  private double finished(String sign, String number, int exponent) throws QuantityException {
    String digits = number.endsWith(".") ? number + "0" : number;
    BigDecimal exact = new BigDecimal(digits).scaleByPowerOfTen(exponent);
    double value = (sign.equals("-") ? exact.negate() : exact).doubleValue();
    if (Double.isInfinite(value)) {
      throw new QuantityException("'" + text + "' is too large; wanted " + wanted());
    }
    return value;
  }

  /** The power of ten of a letter that stands for the decimal sign, where it may. */
  private Optional<Integer> decimalLetter(char letter) {
    boolean ofUnit =
        switch (unit) {
          case OHM -> letter == 'R' || letter == 'Ω';
          case VOLT -> letter == 'V';
          case AMPERE -> letter == 'A';
          case WATT -> letter == 'W';
          case FARAD -> letter == 'F';
          case HENRY -> letter == 'H';
          default -> false;
        };
    return ofUnit ? Optional.of(0) : prefix(letter);
  }

  private Optional<Integer> prefix(char letter) {
    char proper = letter == 'K' ? 'k' : letter;
    return QuantityText.prefixesOf(unit).indexOf(proper) >= 0
        ? Optional.of(QuantityText.exponentOf(proper))
        : Optional.empty();
  }

  /** The power of ten of what follows the number: prefix and unit, either of which may lack. */
  private int tailExponent(String tail, boolean prefixAllowed) throws QuantityException {
    if (tail.isEmpty() || isUnit(tail, unit)) {
      return unit == Unit.FRACTION && !tail.isEmpty() ? -2 : 0;
    }
    Optional<Integer> exponent = prefixAllowed ? prefix(tail.charAt(0)) : Optional.empty();
    String rest = tail.substring(1).strip();
    if (exponent.isPresent() && (rest.isEmpty() || isUnit(rest, unit))) {
      return exponent.get();
    }
    throw new QuantityException(wrongUnit(tail));
  }

  private String wrongUnit(String tail) {
    for (Unit other : Unit.values()) {
      boolean is =
          other != unit
              && (isUnit(tail, other)
                  || (QuantityText.prefixesOf(other).indexOf(tail.charAt(0)) >= 0
                      && isUnit(tail.substring(1), other)));
      if (is) {
        return "'" + text + "' is in " + other.symbol() + "; wanted " + wanted();
      }
    }
    return "'" + text + "' has the unknown unit '" + asWritten(tail) + "'; wanted " + wanted();
  }

  /** The end of the text as the user wrote it: {@code furlong}, where a u reads as µ. */
  private String asWritten(String tail) {
    String end = text.substring(Math.max(0, text.length() - tail.length()));
    return normalised(end).equals(tail) ? end : tail;
  }

  private String wanted() {
    return switch (unit) {
      case NUMBER -> "a plain number";
      case FRACTION -> "a share in %";
      case CELSIUS, KELVIN_PER_WATT, DECIBEL, HOUR -> "a number in " + unit.symbol();
      case OHM -> "a resistance such as 4.7 kΩ";
      case FARAD -> "a capacitance such as 47 nF";
      case HERTZ -> "a frequency such as 455 kHz";
      case HENRY, VOLT, AMPERE, WATT, SECOND, METRE, AMPERE_HOUR ->
          "a number in " + unit.symbol() + " or m" + unit.symbol();
    };
  }

  private static boolean isUnit(String tail, Unit unit) {
    return names(unit).stream().anyMatch(tail::equals)
        || (unit == Unit.OHM && tail.toLowerCase(Locale.ROOT).matches("ohms?"))
        || (unit == Unit.HERTZ && tail.equalsIgnoreCase("Hz"));
  }

  private static List<String> names(Unit unit) {
    List<String> names = new ArrayList<>();
    if (!unit.symbol().isEmpty()) {
      names.add(unit.symbol());
    }
    switch (unit) {
      case OHM -> names.add("R");
      case CELSIUS -> names.add("C");
      case KELVIN_PER_WATT -> names.addAll(List.of("°C/W", "C/W"));
      case VOLT -> names.add("v");
      default -> {}
    }
    return names;
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }

  /** One spelling for the signs that have several: µ, Ω, minus, spaces, digits of any script. */
  private static String normalised(String text) {
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (Character.isDigit(c)) {
        out.append((char) ('0' + Character.digit(c, 10)));
        continue;
      }
      out.append(
          switch (c) {
            case 'u', '\u03bc' -> 'µ';
            case '\u2126' -> 'Ω';
            case '\u2212' -> '-';
            case '\u066b' -> '.';
            case '\u00a0', '\u202f', '\u2009' -> ' ';
            default -> c;
          });
    }
    return out.toString().replace("\u2103", "°C").strip();
  }
}

package earward.study.diagnosis;

import earward.block.quantity.Unit;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import earward.study.faults.FaultReading;
import earward.study.faults.ReadingError;
import earward.study.faults.Tone;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Reads a sheet of readings: CSV, one reading a line, its key and its value with a unit, apart by a
 * comma, a semicolon or a tab.
 *
 * <pre>
 * revision,A
 * digest,fceadd1e
 * TP7:no-signal,4.7 V
 * TP4:ohms,over range
 * tone,silent
 * heat,hot
 * </pre>
 *
 * <p>A reading may stand twice, taken again to be sure. Lines that begin with # and a heading
 * {@code reading,value} are passed over.
 */
public final class ReadingsText {
  private static final String HOT = "hot";
  private static final String COOL = "cool";
  private static final String OVER_RANGE = "over range";

  private final String name;
  private final List<FaultReading> readings;
  private final KitDesign design;
  private final String digest;

  /**
   * A reader of one kit's readings.
   *
   * @param name of the file, for sentences
   * @param readings those that the kit has
   * @param design of the kit
   * @param digest of the design's text, in hexadecimal digits
   */
  public ReadingsText(String name, List<FaultReading> readings, KitDesign design, String digest) {
    this.name = name;
    this.readings = List.copyOf(readings);
    this.design = design;
    this.digest = digest;
  }

  /**
   * The evidence of a text.
   *
   * @throws ReadingsException where a line makes no sense, or the readings are of another revision
   */
  public Evidence read(String text) throws ReadingsException {
    Evidence evidence = Evidence.NONE;
    List<String> lines = text.lines().toList();
    for (int i = 0; i < lines.size(); i++) {
      String line = lines.get(i).replace("\ufeff", "").strip();
      if (!line.isEmpty() && !line.startsWith("#")) {
        evidence = with(evidence, line, i + 1);
      }
    }
    if (evidence.size() == 0) {
      throw new ReadingsException(
          name + " has no reading; wanted lines such as " + example() + ",4.7 V or tone,silent.");
    }
    return evidence;
  }

  private String example() {
    return readings.isEmpty() ? FaultReading.TONE : readings.get(0).key();
  }

  private Evidence with(Evidence evidence, String line, int number) throws ReadingsException {
    String[] cells = line.split("[;\\t]", 2);
    cells = cells.length == 2 ? cells : line.split(",", 2);
    if (cells.length < 2) {
      throw at(number, "is '" + line + "'; wanted a reading and its value, apart by a comma");
    }
    String key = unquoted(cells[0]);
    String value = unquoted(cells[1]);
    if (key.equalsIgnoreCase("reading")) {
      return evidence;
    }
    if (key.equalsIgnoreCase("revision")) {
      requireSame("revision", value, design.revision(), design.revision().equals(value));
      return evidence;
    }
    if (key.equalsIgnoreCase("digest")) {
      boolean same = value.length() >= 8 && digest.startsWith(value.toLowerCase(Locale.ROOT));
      requireSame("design", value, digest.substring(0, 8), same);
      return evidence;
    }
    if (value.isEmpty()) {
      return evidence;
    }
    return taken(evidence, key, value, number);
  }

  private Evidence taken(Evidence evidence, String key, String value, int number)
      throws ReadingsException {
    if (key.equalsIgnoreCase(FaultReading.TONE)) {
      return evidence.with(tone(value, number));
    }
    if (key.equalsIgnoreCase(FaultReading.HEAT)) {
      if (!value.equalsIgnoreCase(HOT) && !value.equalsIgnoreCase(COOL)) {
        throw at(number, "says heat is '" + value + "'; it can be hot or cool");
      }
      return evidence.withHeat(value.equalsIgnoreCase(HOT));
    }
    Optional<FaultReading> found =
        readings.stream().filter(each -> each.key().equalsIgnoreCase(key)).findFirst();
    if (found.isEmpty()) {
      throw at(number, "has the reading '" + key + "', which this kit has not; it has " + known());
    }
    FaultReading reading = found.get();
    if (evidence.times(reading.key()) == 2) {
      throw at(number, "has the reading " + reading.key() + " a third time; two are enough");
    }
    return evidence.with(reading.key(), amount(reading, value, number));
  }

  private static Tone toneOf(String word) {
    for (Tone tone : Tone.values()) {
      if (tone.key().equalsIgnoreCase(word)) {
        return tone;
      }
    }
    throw new IllegalArgumentException(word);
  }

  private Tone tone(String value, int number) throws ReadingsException {
    try {
      return toneOf(value);
    } catch (IllegalArgumentException e) {
      throw at(
          number,
          "says the tone is '"
              + value
              + "'; it can be "
              + Stream.of(Tone.values()).map(Tone::key).collect(Collectors.joining(", ")));
    }
  }

  private double amount(FaultReading reading, String value, int number) throws ReadingsException {
    if (reading.unit() == Unit.OHM && value.equalsIgnoreCase(OVER_RANGE)) {
      return ReadingError.MOST_OHMS;
    }
    try {
      double amount = QuantityText.parse(value, reading.unit());
      return reading.unit() == Unit.OHM ? Math.min(amount, ReadingError.MOST_OHMS) : amount;
    } catch (QuantityException e) {
      throw at(number, "cannot be read: " + plain(e.sentence()));
    }
  }

  private static String plain(String sentence) {
    return sentence.endsWith(".") ? sentence.substring(0, sentence.length() - 1) : sentence;
  }

  private String known() {
    return Stream.concat(
            readings.stream().map(FaultReading::key),
            Stream.of(FaultReading.TONE, FaultReading.HEAT))
        .collect(Collectors.joining(", "));
  }

  private void requireSame(String what, String found, String wanted, boolean same)
      throws ReadingsException {
    if (!same) {
      throw new ReadingsException(
          name
              + " is of "
              + what
              + " "
              + found
              + ", and the design at hand is "
              + wanted
              + "; readings of another revision tell nothing of this one.");
    }
  }

  private static String unquoted(String cell) {
    String text = cell.strip();
    return text.length() >= 2 && text.startsWith("\"") && text.endsWith("\"")
        ? text.substring(1, text.length() - 1).strip()
        : text;
  }

  private ReadingsException at(int line, String what) {
    return new ReadingsException(name + ", line " + line + " " + what + ".");
  }
}

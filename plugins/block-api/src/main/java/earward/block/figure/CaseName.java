package earward.block.figure;

import java.util.List;

/**
 * The name of a state in which the kit is solved: one of the constants, or a partly built kit's.
 *
 * @param text lower case with hyphens
 */
public record CaseName(String text) {
  public static final CaseName UNPOWERED = new CaseName("unpowered");
  public static final CaseName NO_SIGNAL = new CaseName("no-signal");
  public static final CaseName WEAK = new CaseName("weak");
  public static final CaseName TEST = new CaseName("test");
  public static final CaseName STRONG = new CaseName("strong");

  /** Strong carrier, highest tone, deepest modulation. */
  public static final CaseName DEEPEST = new CaseName("deepest");

  /** The test signal with every volume control at full. */
  public static final CaseName FULL_VOLUME = new CaseName("full-volume");

  /** The amplifier at the edge of clipping, whatever drives it. */
  public static final CaseName FULL_OUTPUT = new CaseName("full-output");

  /** Full output from a battery at its end. */
  public static final CaseName BATTERY_LOW = new CaseName("battery-low");

  /**
   * No signal, at the highest voltage that the supply may bring unloaded: the wrong cells in the
   * holder, an adaptor at mains +10 %. For absolute maxima.
   */
  public static final CaseName HIGHEST_SUPPLY = new CaseName("highest-supply");

  /** Highest ambient and supply, any drive, the least load. */
  public static final CaseName HOTTEST = new CaseName("hottest");

  /** All that every design is solved in, in the order in which they are shown. */
  public static final List<CaseName> ALL =
      List.of(
          UNPOWERED,
          NO_SIGNAL,
          WEAK,
          TEST,
          STRONG,
          DEEPEST,
          FULL_VOLUME,
          FULL_OUTPUT,
          BATTERY_LOW,
          HIGHEST_SUPPLY,
          HOTTEST);

  public CaseName {
    if (!text.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "'" + text + "' is no case name; wanted lower case words joined by hyphens");
    }
  }

  /** A kit of which only the stages up to this one are fitted. */
  public static CaseName stage(int number) {
    return new CaseName("stage-" + number);
  }

  @Override
  public String toString() {
    return text;
  }
}

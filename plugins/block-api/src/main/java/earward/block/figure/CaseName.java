package earward.block.figure;

import java.util.List;

/**
 * The name of a state in which the kit is solved: one of the constants, or a partly built kit's.
 *
 * @param text lower case with hyphens
 */
public record CaseName(String text) {
  /** No supply, no carrier. */
  public static final CaseName UNPOWERED = new CaseName("unpowered");

  /** Supply on, no carrier: everything at rest. */
  public static final CaseName NO_SIGNAL = new CaseName("no-signal");

  /** The weakest station wanted, test tone at test depth. */
  public static final CaseName WEAK = new CaseName("weak");

  /** The test signal, knobs where the design has them. */
  public static final CaseName TEST = new CaseName("test");

  /** The strongest station, test tone at test depth. */
  public static final CaseName STRONG = new CaseName("strong");

  /** Strong carrier, highest tone, deepest modulation. */
  public static final CaseName DEEPEST = new CaseName("deepest");

  /** The test signal with every volume control at full. */
  public static final CaseName FULL_VOLUME = new CaseName("full-volume");

  /**
   * Each amplifier IC at the edge of clipping, whatever drives it. It drives nothing else: discrete
   * stages are at rest.
   */
  public static final CaseName FULL_OUTPUT = new CaseName("full-output");

  /** Full output from a battery at its end. */
  public static final CaseName BATTERY_LOW = new CaseName("battery-low");

  /**
   * No signal, at the highest voltage that the supply may bring unloaded: the wrong cells in the
   * holder, an adaptor at mains +10 %. For absolute maxima.
   */
  public static final CaseName HIGHEST_SUPPLY = new CaseName("highest-supply");

  /**
   * Highest ambient and mains, the least load, each amplifier IC at the drive that heats it most,
   * from silence to a square wave. Discrete parts are at rest: their heat is that of no signal at
   * the highest ambient.
   */
  public static final CaseName HOTTEST = new CaseName("hottest");

  /**
   * The test signal with the volume control where its modulation may be least deep; only in a kit
   * with a knob that makes a difference. Asked for by the kit itself, not by a block's checks.
   */
  public static final CaseName WORST_TURN = new CaseName("worst-turn");

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

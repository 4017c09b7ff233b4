package earward.block;

import earward.block.mark.Offered;
import earward.block.setting.SettingValue;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * What a block type can do for a seam where two blocks do not suit one another, once it is put
 * there. The host chooses the values that are left open, solves, and shows what comes of it before
 * it is taken.
 *
 * @param kind what it does
 * @param settings those that make it do so, by setting id; the others stay as usual
 * @param open ids of the value settings that the host is to choose: of a series resistor, a shunt
 *     resistor or a capacitor its own; of a pad the series resistor's, then the shunt's; of a
 *     buffer none
 */
@Offered(since = 1)
public record SeamUse(Kind kind, Map<String, SettingValue> settings, List<String> open) {
  /** What is done. */
  public enum Kind {
    PAD("pad", 2),
    COUPLING_CAPACITOR("coupling-capacitor", 1),
    SERIES_RESISTOR("series-resistor", 1),
    SHUNT_RESISTOR("shunt-resistor", 1),
    BUFFER("buffer", 0);

    private final String key;
    private final int open;

    Kind(String key, int open) {
      this.key = key;
      this.open = open;
    }

    /** The word in files and on the command line. */
    public String key() {
      return key;
    }
  }

  public SeamUse {
    Objects.requireNonNull(kind);
    settings = Map.copyOf(settings);
    open = List.copyOf(open);
    if (open.size() != kind.open) {
      throw new IllegalArgumentException(
          "a "
              + kind.key()
              + " leaves "
              + kind.open
              + " values to the host, found "
              + open.size()
              + ": "
              + open);
    }
  }
}

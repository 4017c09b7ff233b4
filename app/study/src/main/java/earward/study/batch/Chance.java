package earward.study.batch;

/**
 * Random numbers by their place: what a kit draws for a part depends on the seed, the kit's number
 * and the part's name alone. So kits may be drawn in any order and by any thread, and a change of
 * one tolerance leaves all other draws as they were.
 *
 * <p>Source: the output function of SplitMix64 (Steele, Lea, Flood: Fast splittable pseudorandom
 * number generators, OOPSLA 2014), used on counters.
 */
public final class Chance {
  private static final long GOLDEN = 0x9e3779b97f4a7c15L;
  private static final long FNV_OFFSET = 0xcbf29ce484222325L;
  private static final long FNV_PRIME = 0x100000001b3L;
  private static final double TO_UNIT = 0x1.0p-53;

  private Chance() {}

  /** The stream of a name: FNV-1a (Fowler, Noll, Vo), the same on every machine. */
  public static long stream(String name) {
    long hash = FNV_OFFSET;
    for (int i = 0; i < name.length(); i++) {
      hash = (hash ^ name.charAt(i)) * FNV_PRIME;
    }
    return mixed(hash);
  }

  /**
   * An even draw.
   *
   * @param seed of the batch
   * @param index of the kit or the lot
   * @param stream of what is drawn, see {@link #stream}
   * @return above 0, below 1
   */
  public static double unit(long seed, long index, long stream) {
    long kit = mixed(mixed(seed + GOLDEN) + index * GOLDEN);
    long bits = mixed(kit ^ stream) >>> 11;
    return (bits + 0.5) * TO_UNIT;
  }

  /** An even draw from above −1 to below 1. */
  public static double evenly(long seed, long index, long stream) {
    return 2 * unit(seed, index, stream) - 1;
  }

  private static long mixed(long value) {
    long z = value + GOLDEN;
    z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
    z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
    return z ^ (z >>> 31);
  }
}

package earward.engine;

/**
 * A named place between two nodes where voltages are wanted, and where a meter may hang.
 *
 * @param name unique, for instance {@code volume.wiper} or {@code path}
 * @param plus the node of the red lead
 * @param minus the node of the black lead, {@code ground} for most
 */
public record Probe(String name, String plus, String minus) {
  public Probe {
    if (name.isBlank()) {
      throw new IllegalArgumentException("a probe has no name");
    }
  }
}

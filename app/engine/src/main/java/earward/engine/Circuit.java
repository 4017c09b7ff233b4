package earward.engine;

import earward.block.law.ToneCurve;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * The whole path as one circuit, supplies and rails included. The node {@code ground} is the
 * reference.
 *
 * @param parts all parts
 * @param seams where blocks meet
 * @param probes named places for voltages
 * @param frontEnd what the receiver before it leaves of the sidebands
 * @param curve what its audio response is held against
 */
public record Circuit(
    List<CircuitPart> parts,
    List<Seam> seams,
    List<Probe> probes,
    FrontEnd frontEnd,
    ToneCurve curve) {
  /** Name of the reference node. */
  public static final String GROUND = "ground";

  public Circuit {
    parts = List.copyOf(parts);
    seams = List.copyOf(seams);
    probes = List.copyOf(probes);
    Objects.requireNonNull(frontEnd);
    Objects.requireNonNull(curve);
    Set<String> seen = new HashSet<>();
    parts.forEach(part -> requireNew(seen, "part ", part.name()));
    seams.forEach(seam -> requireNew(seen, "seam ", seam.name()));
    probes.forEach(probe -> requireNew(seen, "probe ", probe.name()));
  }

  /** A circuit behind a flat front end, wanted flat. */
  public Circuit(List<CircuitPart> parts, List<Seam> seams, List<Probe> probes) {
    this(parts, seams, probes, FrontEnd.FLAT, ToneCurve.flat());
  }

  private static void requireNew(Set<String> seen, String kind, String name) {
    if (!seen.add(kind + name)) {
      throw new IllegalArgumentException("there are two of " + kind + name);
    }
  }
}

package earward.kit.path;

import earward.block.Role;
import earward.engine.Probe;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the back end's noise is given: the detector's exit, the seams behind it, the path's end.
 */
final class NoisePlaces {
  private NoisePlaces() {}

  static List<String> of(Assembly assembly) {
    List<String> places = new ArrayList<>();
    boolean audio = false;
    for (PlacedBlock block : assembly.path()) {
      if (audio) {
        places.add("seam." + block.id());
      } else if (block.type().role() == Role.DETECTOR) {
        places.add(block.id());
        audio = true;
      }
    }
    places.add(CircuitBuilder.PATH);
    List<String> probes = assembly.circuit().probes().stream().map(Probe::name).toList();
    return places.stream().filter(probes::contains).toList();
  }
}

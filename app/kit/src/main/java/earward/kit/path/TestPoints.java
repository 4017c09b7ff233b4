package earward.kit.path;

import earward.block.check.Finding;
import earward.block.wiring.TestPoint;
import earward.kit.design.AddedTestPoint;
import earward.kit.design.KitDesign;
import earward.kit.design.References;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/** The test points of a kit: those of its blocks in the order of the path, then the designer's. */
final class TestPoints {
  private record Found(String node, String words) {}

  private final Map<String, Found> byPlace = new LinkedHashMap<>();
  private final List<Finding> findings = new ArrayList<>();

  TestPoints(
      KitDesign design, List<PlacedBlock> path, List<PlacedBlock> beside, Set<String> nodes) {
    Stream.concat(path.stream(), beside.stream()).forEach(this::take);
    for (AddedTestPoint added : design.addedTestPoints()) {
      if (nodes.contains(added.node())) {
        byPlace.put(added.place(), new Found(added.node(), added.words()));
      } else {
        findings.add(PathFindings.nodeMissing(added.id(), added.node()));
      }
    }
  }

  private void take(PlacedBlock block) {
    for (TestPoint testPoint : block.description().wiring().testPoints()) {
      String node = block.globalNode(testPoint.node());
      if (!testPoint.id().equals(testPoint.node())
          && block.globalNodes().containsKey(testPoint.id())) {
        findings.add(PathFindings.testPointAmbiguous(block, testPoint.id(), testPoint.node()));
      }
      byPlace.put(block.id() + "." + testPoint.id(), new Found(node, ""));
    }
  }

  List<Finding> findings() {
    return findings;
  }

  List<String> places() {
    return List.copyOf(byPlace.keySet());
  }

  /** The node of each place. */
  Map<String, String> nodes() {
    Map<String, String> nodes = new LinkedHashMap<>();
    byPlace.forEach((place, found) -> nodes.put(place, found.node()));
    return nodes;
  }

  List<PlacedTestPoint> placed(References references) {
    List<PlacedTestPoint> placed = new ArrayList<>();
    byPlace.forEach(
        (place, found) ->
            placed.add(
                new PlacedTestPoint(
                    place,
                    found.node(),
                    references.ofTestPoint(place).orElseThrow(),
                    found.words())));
    return placed;
  }
}

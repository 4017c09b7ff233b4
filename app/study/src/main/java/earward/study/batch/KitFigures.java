package earward.study.batch;

import earward.block.figure.FigureName;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Picks named figures out of a solved row. Immutable; shared by all threads. */
final class KitFigures {
  private final CompiledKit kit;
  private final List<FigureName> names;
  private final int[] index;
  private final boolean derives;

  KitFigures(CompiledKit kit, List<FigureName> names) {
    this.kit = kit;
    this.names = List.copyOf(names);
    Map<FigureName, Integer> places = new HashMap<>();
    for (int i = 0; i < kit.circuit().figures().size(); i++) {
      places.put(kit.circuit().figures().get(i), i);
    }
    index = new int[names.size()];
    boolean any = false;
    for (int i = 0; i < index.length; i++) {
      index[i] = places.getOrDefault(names.get(i), -1);
      any |= index[i] < 0;
    }
    derives = any;
  }

  List<FigureName> names() {
    return names;
  }

  /** The figures of a row, NaN for one that does not exist. */
  double[] of(double[] row) {
    double[] picked = new double[index.length];
    Figures derived = derives ? kit.figures(row) : Figures.NONE;
    for (int i = 0; i < index.length; i++) {
      picked[i] = index[i] >= 0 ? row[index[i]] : derived.orNaN(names.get(i));
    }
    return picked;
  }
}

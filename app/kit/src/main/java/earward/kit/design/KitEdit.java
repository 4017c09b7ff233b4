package earward.kit.design;

import java.util.List;

/** Collects the changes of one edit, so that each edit names only what it changes. */
final class KitEdit {
  private final KitDesign from;
  private String title;
  private String revision;
  private KitConditions conditions;
  private List<BlockEntry> path;
  private List<BlockEntry> supplies;
  private List<BlockEntry> takeOffs;
  private Tolerances tolerances;
  private List<AddedTestPoint> addedTestPoints;
  private References references;
  private SheetOptions sheet;
  private Bench bench;

  KitEdit(KitDesign from) {
    this.from = from;
    title = from.title();
    revision = from.revision();
    conditions = from.conditions();
    path = from.path();
    supplies = from.supplies();
    takeOffs = from.takeOffs();
    tolerances = from.tolerances();
    addedTestPoints = from.addedTestPoints();
    references = from.references();
    sheet = from.sheet();
    bench = from.bench();
  }

  KitEdit title(String changed) {
    title = changed;
    return this;
  }

  KitEdit revision(String changed) {
    revision = changed;
    return this;
  }

  KitEdit conditions(KitConditions changed) {
    conditions = changed;
    return this;
  }

  KitEdit path(List<BlockEntry> changed) {
    path = changed;
    return this;
  }

  KitEdit supplies(List<BlockEntry> changed) {
    supplies = changed;
    return this;
  }

  KitEdit takeOffs(List<BlockEntry> changed) {
    takeOffs = changed;
    return this;
  }

  KitEdit tolerances(Tolerances changed) {
    tolerances = changed;
    return this;
  }

  KitEdit addedTestPoints(List<AddedTestPoint> changed) {
    addedTestPoints = changed;
    return this;
  }

  KitEdit references(References changed) {
    references = changed;
    return this;
  }

  KitEdit sheet(SheetOptions changed) {
    sheet = changed;
    return this;
  }

  KitEdit bench(Bench changed) {
    bench = changed;
    return this;
  }

  KitDesign done() {
    return new KitDesign(
        title,
        revision,
        conditions,
        path,
        supplies,
        takeOffs,
        tolerances,
        addedTestPoints,
        references,
        sheet,
        bench,
        from.written());
  }
}

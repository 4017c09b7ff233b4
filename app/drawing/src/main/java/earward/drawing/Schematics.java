package earward.drawing;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.page.Page;
import earward.drawing.internal.place.BlockPlan;
import earward.drawing.internal.place.BlockTask;
import earward.drawing.internal.place.Placer;
import earward.drawing.internal.reading.OverlapReader;
import earward.drawing.internal.route.Router;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** Lays circuit drawings out from block descriptions. */
public final class Schematics {
  /** Air beyond the usual, in points, tried one after the other until every wire finds a way. */
  private static final double[] SPACINGS = {0, 2, 4, 7, 12};

  private Schematics() {}

  /**
   * The drawing of a signal path and what stands beside it.
   *
   * @param path blocks in the order of the signal
   * @param beside supplies and take-offs
   */
  public static Schematic lay(
      List<SheetBlock> path, List<SheetBlock> beside, LayoutOptions options) {
    Lettering lettering = new Lettering(options.font());
    double scale = options.textPoints() / Lettering.SIZE_POINTS;
    Tasks tasks = new Tasks(path, beside);
    List<BlockPlan> pathPlans = new ArrayList<>();
    List<Integer> gaps = List.of();
    for (SheetBlock block : path) {
      BlockPlan plan = plan(tasks.task(block, gaps), lettering);
      pathPlans.add(plan);
      gaps = plan.exitRows().stream().map(row -> row - plan.exitRows().get(0)).toList();
    }
    List<BlockPlan> besidePlans =
        beside.stream().map(block -> plan(tasks.task(block, List.of()), lettering)).toList();
    Page page =
        new Page(
            lettering, options.widthPoints() / scale, options.words().to(), options.words().from());
    Page.Laid laid = page.lay(pathPlans, besidePlans, tasks.flagNames());
    return schematic(laid, scale, options);
  }

  private static Schematic schematic(Page.Laid laid, double scale, LayoutOptions options) {
    double width = options.widthPoints();
    double height = 0;
    List<Rectangle2D.Double> rows = new ArrayList<>();
    for (Box line : laid.lines()) {
      width = Math.max(width, line.right() * scale);
      height = Math.max(height, line.bottom() * scale);
      rows.add(
          new Rectangle2D.Double(
              line.left() * scale,
              line.top() * scale,
              line.width() * scale,
              line.height() * scale));
    }
    return new Schematic(width, height, scale, options.font(), laid.elements(), rows);
  }

  /** With wires where they find a way; a block that is too tangled gets flags instead. */
  private static BlockPlan plan(BlockTask task, Lettering lettering) {
    Set<String> split = new TreeSet<>();
    Optional<BlockPlan> found = wired(task, lettering);
    for (String net : task.splittable()) {
      if (found.isPresent()) {
        break;
      }
      found = wired(task.split(Set.of(net)), lettering);
    }
    for (String net : task.splittable()) {
      if (found.isPresent()) {
        break;
      }
      split.add(net);
      found = wired(task.split(split), lettering);
    }
    return found.orElseThrow(
        () ->
            new IllegalStateException(
                "block '" + task.id() + "' cannot be drawn: some part or wire finds no place"));
  }

  private static Optional<BlockPlan> wired(BlockTask task, Lettering lettering) {
    for (double spacing : SPACINGS) {
      Optional<BlockPlan> plan = Placer.plan(task, lettering, spacing);
      if (plan.isPresent()) {
        Optional<List<Element>> drawn = Router.draw(plan.get(), Router.groundRow(plan.get()));
        if (drawn.isPresent() && OverlapReader.read(drawn.get()).isEmpty()) {
          return plan;
        }
      }
    }
    return Optional.empty();
  }

  /** The drawing of one block alone. */
  public static Schematic single(SheetBlock block, LayoutOptions options) {
    return lay(List.of(block), List.of(), options);
  }
}

package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.path.KitCurves;
import earward.kit.review.ReviewedKit;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * What is being solved for one open design, and what came of it. Lives on the event thread. Every
 * result carries the number of the edit that asked for it and is dropped where a later edit came in
 * between, so that an older result never overwrites a newer one.
 */
final class SolveFlow {
  private final Solving solving;
  private final Lanes lanes;
  private final Runnable changed;
  private Readings readings = Readings.NONE;
  private @Nullable KitDesign sought;
  private Optional<KitCurves> curves = Optional.empty();
  private boolean curvesCurrent;
  private boolean curvesAsked;
  private boolean remediesAsked;
  private boolean remediesCurrent;
  private int edit;
  private int typed;

  /** The edit for which curves or remedies are on their way. */
  private int curvesFor = -1;

  private int remediesFor = -1;

  SolveFlow(Solving solving, Lanes lanes, Runnable changed) {
    this.solving = solving;
    this.lanes = lanes;
    this.changed = changed;
  }

  Readings readings() {
    return readings;
  }

  /** Forgets all figures: another document is on the workbench. */
  void clear() {
    readings = Readings.NONE;
    curves = Optional.empty();
    curvesCurrent = false;
    edit++;
  }

  /** Whether the whole review of the present design is still to come. */
  boolean busy() {
    return !readings.settled() && readings.fault().isEmpty();
  }

  /** Solves an edited design: its headline first, then all of it. */
  void settle(KitDesign design) {
    edit++;
    typed++;
    int mine = edit;
    int myHeadline = typed;
    readings = readings.edited();
    sought = design;
    curvesCurrent = false;
    remediesCurrent = false;
    lanes
        .quick()
        .start(
            () -> solving.headline(design),
            kit -> {
              if (myHeadline == typed && !readings.settled()) {
                readings = readings.withHeadline(kit);
                changed.run();
              }
            },
            fault -> fail(mine, fault));
    lanes
        .thorough()
        .start(() -> solving.review(design), kit -> take(mine, kit), fault -> fail(mine, fault));
  }

  /** Solves the headline of what is being typed. */
  void preview(KitDesign draft) {
    typed++;
    int mine = typed;
    readings = readings.typed();
    lanes
        .quick()
        .start(
            () -> solving.headline(draft),
            kit -> {
              if (mine == typed) {
                readings = readings.withHeadline(kit);
                changed.run();
              }
            },
            fault -> {});
  }

  /** What was typed is no more. */
  void unpreview() {
    typed++;
    readings = readings.untyped();
  }

  private void take(int of, ReviewedKit kit) {
    if (of == edit) {
      readings = readings.withReview(kit);
      changed.run();
      follow();
    }
  }

  private void fail(int of, Exception fault) {
    if (of == edit) {
      readings = readings.failed(Words.of("solve.failed", said(fault)));
      changed.run();
    }
  }

  private static String said(Exception fault) {
    return fault.getMessage() == null ? fault.getClass().getSimpleName() : fault.getMessage();
  }

  /** Asks for curves from now on, or no more. */
  void askCurves(boolean asked) {
    curvesAsked = asked;
    follow();
  }

  /** Asks for remedies from now on, or no more. */
  void askRemedies(boolean asked) {
    remediesAsked = asked;
    follow();
  }

  Optional<KitCurves> curves() {
    return curves;
  }

  boolean curvesCurrent() {
    return curvesCurrent;
  }

  /** Whether remedies are being looked for. */
  boolean seeking() {
    return remediesAsked && !remediesCurrent && readings.settled();
  }

  /** What follows a review, one thing after the other: curves, then remedies. */
  private void follow() {
    KitDesign design = sought;
    if (design == null || !readings.settled() || readings.reviewed().isEmpty()) {
      return;
    }
    int mine = edit;
    ReviewedKit reviewed = readings.reviewed().get();
    if (curvesAsked && !curvesCurrent) {
      if (curvesFor == mine) {
        return;
      }
      curvesFor = mine;
      remediesFor = -1; // the lane does one thing at a time: the later takes the place
      lanes.late().start(() -> solving.curves(design), found -> show(mine, found), fault -> {});
    } else if (remediesAsked && !remediesCurrent && remediesFor != mine) {
      remediesFor = mine;
      lanes.late().start(() -> solving.remedies(reviewed), kit -> remedied(mine, kit), fault -> {});
    }
  }

  private void show(int of, Optional<KitCurves> found) {
    if (of == edit) {
      curves = found;
      curvesCurrent = true;
      changed.run();
      follow();
    }
  }

  private void remedied(int of, ReviewedKit kit) {
    if (of == edit) {
      remediesCurrent = true;
      readings = readings.withReview(kit);
      changed.run();
    }
  }
}

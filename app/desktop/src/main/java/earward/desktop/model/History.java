package earward.desktop.model;

import earward.kit.design.KitDesign;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The designs of one document from the first on, and where among them we are. Immutable. */
public final class History {
  private final List<Step> steps;
  private final int at;

  /**
   * A design and the edit that led to it.
   *
   * @param name of the edit, empty for the first
   * @param design as it was after it
   */
  private record Step(String name, KitDesign design) {}

  private History(List<Step> steps, int at) {
    this.steps = List.copyOf(steps);
    this.at = at;
  }

  /** A document as it was opened. */
  public static History of(KitDesign design) {
    return new History(List.of(new Step("", design)), 0);
  }

  /** The present design. */
  public KitDesign design() {
    return steps.get(at).design();
  }

  /** After an edit; what was undone before is forgotten. */
  public History edited(String name, KitDesign design) {
    List<Step> more = new ArrayList<>(steps.subList(0, at + 1));
    more.add(new Step(name, design));
    return new History(more, more.size() - 1);
  }

  /** With the last edit going further: still one step. */
  public History amended(String name, KitDesign design) {
    return at == 0
        ? edited(name, design)
        : new History(steps.subList(0, at), at - 1).edited(name, design);
  }

  /** Name of the edit that can be undone. */
  public Optional<String> undoable() {
    return at > 0 ? Optional.of(steps.get(at).name()) : Optional.empty();
  }

  /** Name of the edit that can be done again. */
  public Optional<String> redoable() {
    return at + 1 < steps.size() ? Optional.of(steps.get(at + 1).name()) : Optional.empty();
  }

  /** One edit back; the same where there is none. */
  public History undone() {
    return at > 0 ? new History(steps, at - 1) : this;
  }

  /** One edit on; the same where there is none. */
  public History redone() {
    return at + 1 < steps.size() ? new History(steps, at + 1) : this;
  }
}

package earward.desktop.view;

import earward.block.BlockType;
import earward.block.Role;
import earward.desktop.model.BlockOffer;
import earward.desktop.model.PathEdits;
import earward.desktop.model.Selection;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import java.awt.Component;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.BiFunction;
import org.jspecify.annotations.Nullable;

/** What the user may do to the blocks: add, replace, remove, move. */
final class BlockCommands {
  private final Workbench workbench;
  private final Runnable toSettings;
  private @Nullable Component owner;

  BlockCommands(Workbench workbench, Runnable toSettings) {
    this.workbench = workbench;
    this.toSettings = toSettings;
  }

  /** Where its dialogs stand. */
  void over(Component component) {
    owner = component;
  }

  private KitDesign design() {
    return workbench.design();
  }

  /** The block that is selected, or that whose seam is. */
  private String block() {
    return Selection.seamOf(workbench.selected()).orElse(workbench.selected());
  }

  /** The place in the path at which a new block would stand: at a seam there, else behind. */
  private int place() {
    int index = PathEdits.indexOf(design(), block());
    boolean seam = Selection.seamOf(workbench.selected()).isPresent();
    if (workbench.selected().equals(Selection.CONDITIONS)) {
      return 0;
    }
    return index < 0 ? design().path().size() : seam ? index : index + 1;
  }

  void toSettings() {
    toSettings.run();
  }

  /** Adds a block at the seam or behind the card that is selected. */
  void add() {
    int at = place();
    KitDesign before = design();
    choose(
        Words.of("choose.add"),
        () -> workbench.path().offers(before, at),
        (design, type) -> workbench.path().inserted(design, at, type));
  }

  /** Fills the ghost of a role. */
  void fill(Role role) {
    KitDesign before = design();
    if (!role.inPath()) {
      beside();
      return;
    }
    int at = role == Role.LOAD ? before.path().size() : Math.min(1, before.path().size());
    int index = role == Role.FEED ? 0 : at;
    choose(
        Words.of("choose.add"),
        () ->
            workbench.path().offers(before, index).stream()
                .filter(offer -> offer.role() == role)
                .toList(),
        (design, type) -> workbench.path().inserted(design, index, type));
  }

  /** Adds a supply or a take-off. */
  void beside() {
    choose(
        Words.of("choose.beside"),
        () -> workbench.path().besides(),
        (design, type) -> Optional.of(workbench.path().addedBeside(design, type)));
  }

  /** Puts another block in the place of the one that is selected. */
  void replace() {
    String id = block();
    KitDesign before = design();
    if (before.block(id).isPresent()) {
      choose(
          Words.of("choose.replace", workbench.forms().title(before, id)),
          () -> workbench.path().replacements(before, id),
          (design, type) -> workbench.path().replaced(design, id, type));
    }
  }

  private void choose(
      String title,
      Callable<List<BlockOffer>> offers,
      BiFunction<KitDesign, BlockType, Optional<KitDesign>> put) {
    workbench
        .lanes()
        .asked()
        .start(
            offers,
            found -> {
              if (found.isEmpty()) {
                workbench.say(Words.of("choose.none"));
              } else {
                BlockChooser.choose(owner, title, found).ifPresent(offer -> put(offer, put));
              }
            },
            fault -> workbench.say(Words.of("choose.failed", String.valueOf(fault.getMessage()))));
  }

  private void put(BlockOffer offer, BiFunction<KitDesign, BlockType, Optional<KitDesign>> put) {
    List<String> before = design().blocks().stream().map(BlockEntry::id).toList();
    workbench
        .workshop()
        .types()
        .find(offer.typeId())
        .flatMap(type -> put.apply(design(), type))
        .ifPresent(
            after -> {
              workbench.edit(Words.of("edit.block", offer.name()), design -> after);
              after.blocks().stream()
                  .filter(block -> !before.contains(block.id()))
                  .reduce((first, last) -> last)
                  .ifPresent(block -> workbench.select(block.id()));
            });
  }

  /** Removes the block that is selected; the one before it is selected then. */
  void remove() {
    String id = workbench.selected();
    if (design().block(id).isPresent()) {
      int index = PathEdits.indexOf(design(), id);
      String name = workbench.forms().title(design(), id);
      workbench.edit(Words.of("edit.remove", name), design -> design.withoutBlock(id));
      if (index > 0) {
        workbench.select(design().path().get(index - 1).id());
      }
    }
  }

  /** Moves the block that is selected along the path, over as many as it takes to stand again. */
  void move(int step) {
    String id = workbench.selected();
    int from = PathEdits.indexOf(design(), id);
    for (int to = from + step; from >= 0 && to >= 0 && to < design().path().size(); to += step) {
      Optional<KitDesign> after = workbench.path().moved(design(), id, to);
      if (after.isPresent()) {
        moved(id, after.get());
        return;
      }
    }
    workbench.say(Words.of("move.nowhere"));
  }

  /** Moves a block to where another stands, if it can stand there. */
  void moveOnto(String id, String target) {
    int to = PathEdits.indexOf(design(), target);
    Optional<KitDesign> after = workbench.path().moved(design(), id, to);
    if (after.isPresent()) {
      moved(id, after.get());
    } else {
      workbench.say(Words.of("move.not-there"));
    }
  }

  private void moved(String id, KitDesign after) {
    String name = workbench.forms().title(design(), id);
    workbench.edit(Words.of("edit.move", name), design -> after);
  }
}

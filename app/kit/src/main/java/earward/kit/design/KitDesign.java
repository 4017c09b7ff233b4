package earward.kit.design;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

/**
 * The document: everything that one kit design says. Immutable; an edit is a function from design
 * to design.
 *
 * @param title of the kit
 * @param revision as printed on the sheet, for instance {@code A}
 * @param conditions what it must work under
 * @param path the signal path from feed to load
 * @param supplies beside the path
 * @param takeOffs beside the path, each joined to a node of it
 * @param tolerances of the parts
 * @param addedTestPoints the designer's own test points
 * @param references given once
 * @param sheet how the build sheet is to look
 * @param bench the builder's instruments
 * @param written how the file had it, what this program does not know among it
 */
public record KitDesign(
    String title,
    String revision,
    KitConditions conditions,
    List<BlockEntry> path,
    List<BlockEntry> supplies,
    List<BlockEntry> takeOffs,
    Tolerances tolerances,
    List<AddedTestPoint> addedTestPoints,
    References references,
    SheetOptions sheet,
    Bench bench,
    AsWritten written) {
  public KitDesign {
    Objects.requireNonNull(title);
    Objects.requireNonNull(revision);
    Objects.requireNonNull(conditions);
    path = List.copyOf(path);
    supplies = List.copyOf(supplies);
    takeOffs = List.copyOf(takeOffs);
    Objects.requireNonNull(tolerances);
    addedTestPoints = List.copyOf(addedTestPoints);
    Objects.requireNonNull(references);
    Objects.requireNonNull(sheet);
    Objects.requireNonNull(bench);
    Objects.requireNonNull(written);
    Set<String> ids = new HashSet<>();
    Stream.of(path, supplies, takeOffs)
        .flatMap(List::stream)
        .forEach(block -> requireNew(ids, block.id(), "blocks"));
    Set<String> testPointIds = new HashSet<>();
    addedTestPoints.forEach(point -> requireNew(testPointIds, point.id(), "added test points"));
  }

  private static void requireNew(Set<String> ids, String id, String what) {
    if (!ids.add(id)) {
      throw new IllegalArgumentException("two " + what + " are named '" + id + "'");
    }
  }

  /** An empty design. */
  public static KitDesign empty(String title, KitConditions conditions) {
    return new KitDesign(
        title,
        "A",
        conditions,
        List.of(),
        List.of(),
        List.of(),
        Tolerances.USUAL,
        List.of(),
        References.NONE,
        SheetOptions.USUAL,
        Bench.USUAL,
        AsWritten.NEW);
  }

  /** All blocks: the path, then supplies, then take-offs. */
  public List<BlockEntry> blocks() {
    return Stream.of(path, supplies, takeOffs).flatMap(List::stream).toList();
  }

  /** The block of this id. */
  public Optional<BlockEntry> block(String id) {
    return blocks().stream().filter(block -> block.id().equals(id)).findFirst();
  }

  private KitEdit edit() {
    return new KitEdit(this);
  }

  /** This design with another title. */
  public KitDesign withTitle(String changed) {
    return edit().title(changed).done();
  }

  /** This design with another revision. */
  public KitDesign withRevision(String changed) {
    return edit().revision(changed).done();
  }

  /** This design under other conditions. */
  public KitDesign withConditions(KitConditions changed) {
    return edit().conditions(changed).done();
  }

  /** This design with other tolerances. */
  public KitDesign withTolerances(Tolerances changed) {
    return edit().tolerances(changed).done();
  }

  /** This design with other references. */
  public KitDesign withReferences(References changed) {
    return edit().references(changed).done();
  }

  /** This design with other sheet options. */
  public KitDesign withSheet(SheetOptions changed) {
    return edit().sheet(changed).done();
  }

  /** This design with another bench. */
  public KitDesign withBench(Bench changed) {
    return edit().bench(changed).done();
  }

  /** This design with other test points of the designer's own. */
  public KitDesign withAddedTestPoints(List<AddedTestPoint> changed) {
    return edit().addedTestPoints(changed).done();
  }

  /**
   * This design with one block changed.
   *
   * @throws IllegalArgumentException when there is no such block
   */
  public KitDesign withBlock(String blockId, UnaryOperator<BlockEntry> change) {
    if (block(blockId).isEmpty()) {
      throw new IllegalArgumentException("there is no block '" + blockId + "'");
    }
    return edit()
        .path(changed(path, blockId, change))
        .supplies(changed(supplies, blockId, change))
        .takeOffs(changed(takeOffs, blockId, change))
        .done();
  }

  private static List<BlockEntry> changed(
      List<BlockEntry> blocks, String id, UnaryOperator<BlockEntry> change) {
    return blocks.stream()
        .map(block -> block.id().equals(id) ? change.apply(block) : block)
        .toList();
  }

  /** This design with one setting changed to words, for instance {@code 4.7 kΩ}. */
  public KitDesign withSetting(String blockId, String settingId, String words) {
    return withBlock(blockId, block -> block.with(settingId, words));
  }

  /** This design with one setting changed. */
  public KitDesign withSetting(String blockId, String settingId, SettingEntry entry) {
    return withBlock(blockId, block -> block.with(settingId, entry));
  }

  /** This design with a block put into the path at an index, 0 for the front. */
  public KitDesign addBlock(int index, BlockEntry block) {
    List<BlockEntry> more = new ArrayList<>(path);
    more.add(index, block);
    return edit().path(more).done();
  }

  /** This design with the blocks of its path in another order, others gone or new among them. */
  public KitDesign withPath(List<BlockEntry> changed) {
    return edit().path(changed).done();
  }

  /** This design with a supply more. */
  public KitDesign addSupply(BlockEntry supply) {
    return edit().supplies(Stream.concat(supplies.stream(), Stream.of(supply)).toList()).done();
  }

  /** This design with a take-off more. */
  public KitDesign addTakeOff(BlockEntry takeOff) {
    return edit().takeOffs(Stream.concat(takeOffs.stream(), Stream.of(takeOff)).toList()).done();
  }

  /** This design without a block; its references stay, should it come back. */
  public KitDesign withoutBlock(String blockId) {
    return edit()
        .path(without(path, blockId))
        .supplies(without(supplies, blockId))
        .takeOffs(without(takeOffs, blockId))
        .done();
  }

  private static List<BlockEntry> without(List<BlockEntry> blocks, String id) {
    return blocks.stream().filter(block -> !block.id().equals(id)).toList();
  }
}

package earward.desktop.model;

import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.Role;
import earward.block.wiring.Port;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * What may be done to the blocks of a design. A block is offered only where it can stand: the
 * design with it is assembled, and no new fault of order or ports may come up.
 */
public final class PathEdits {
  private final Workshop workshop;
  private final Standings standings;

  PathEdits(Workshop workshop) {
    this.workshop = workshop;
    standings = new Standings(workshop);
  }

  /** The types that can stand in the path at an index, 0 for the front. */
  public List<BlockOffer> offers(KitDesign design, int index) {
    return inPath()
        .filter(type -> inserted(design, index, type).isPresent())
        .map(PathEdits::offer)
        .toList();
  }

  /** The types that can take the place of a block of the path. */
  public List<BlockOffer> replacements(KitDesign design, String blockId) {
    Stream<BlockType> all = isBeside(design, blockId) ? besideLike(design, blockId) : inPath();
    return all.filter(type -> !type.id().equals(typeId(design, blockId)))
        .filter(type -> replaced(design, blockId, type).isPresent())
        .map(PathEdits::offer)
        .toList();
  }

  /** Supplies and take-offs. */
  public List<BlockOffer> besides() {
    return workshop.types().all().stream()
        .filter(type -> !type.role().inPath())
        .sorted(byRole())
        .map(PathEdits::offer)
        .toList();
  }

  private Stream<BlockType> inPath() {
    return workshop.types().all().stream().filter(type -> type.role().inPath()).sorted(byRole());
  }

  private Stream<BlockType> besideLike(KitDesign design, String blockId) {
    Optional<Role> role = workshop.types().find(typeId(design, blockId)).map(BlockType::role);
    return workshop.types().all().stream()
        .filter(type -> role.filter(type.role()::equals).isPresent());
  }

  private static Comparator<BlockType> byRole() {
    return Comparator.comparing(BlockType::role).thenComparing(BlockType::id);
  }

  private static BlockOffer offer(BlockType type) {
    BlockTexts texts = Texts.of(type);
    return new BlockOffer(type.id(), texts.get("name"), texts.find("help").orElse(""), type.role());
  }

  private static String typeId(KitDesign design, String blockId) {
    return design.block(blockId).map(BlockEntry::typeId).orElse("");
  }

  private static boolean isBeside(KitDesign design, String blockId) {
    return design.path().stream().noneMatch(block -> block.id().equals(blockId));
  }

  /** The design with a type put into its path, where it can stand there. */
  public Optional<KitDesign> inserted(KitDesign design, int index, BlockType type) {
    BlockEntry entry = BlockEntry.of(freshId(design, type), type.id());
    if (design.path().isEmpty() && type.role() != Role.FEED) {
      return withFeed(design, type, entry);
    }
    return standings.fitted(design, entry, (to, block) -> to.addBlock(index, block));
  }

  /** An empty path gets its feed together with the first block. */
  private Optional<KitDesign> withFeed(KitDesign design, BlockType type, BlockEntry entry) {
    if (type.role() != Role.DETECTOR) {
      return Optional.empty();
    }
    for (BlockType feed : inPath().filter(each -> each.role() == Role.FEED).toList()) {
      KitDesign begun = design.addBlock(0, BlockEntry.of(freshId(design, feed), feed.id()));
      Optional<KitDesign> whole =
          standings.fitted(begun, entry, (to, block) -> to.addBlock(1, block));
      if (whole.isPresent()) {
        return whole;
      }
    }
    return Optional.empty();
  }

  /** The design with a supply or take-off more; a take-off joins at the detector's way out. */
  public KitDesign addedBeside(KitDesign design, BlockType type) {
    BlockEntry entry = BlockEntry.of(freshId(design, type), type.id());
    return type.role() == Role.SUPPLY
        ? design.addSupply(entry)
        : design.addTakeOff(joinNode(design).map(entry::joiningAt).orElse(entry));
  }

  private Optional<String> joinNode(KitDesign design) {
    Assembly assembly = Assembler.assemble(design, workshop.types(), workshop.parts());
    return assembly.path().stream()
        .filter(block -> block.type().role() == Role.DETECTOR)
        .flatMap(PathEdits::wayOut)
        .findFirst()
        .or(() -> assembly.path().stream().flatMap(PathEdits::wayOut).findFirst());
  }

  private static Stream<String> wayOut(PlacedBlock block) {
    return block.description().wiring().exit().map(Port::nodes).stream()
        .flatMap(List::stream)
        .limit(1)
        .map(block::globalNode);
  }

  /** The design with a block of another type in the place of one; like settings are kept. */
  public Optional<KitDesign> replaced(KitDesign design, String blockId, BlockType type) {
    Optional<BlockEntry> old = design.block(blockId);
    if (old.isEmpty()) {
      return Optional.empty();
    }
    BlockEntry entry = standings.keeping(old.get(), type);
    return standings.fitted(design, entry, (to, block) -> to.withBlock(blockId, former -> block));
  }

  /** The design with a block of the path moved to an index, where it can stand there. */
  public Optional<KitDesign> moved(KitDesign design, String blockId, int to) {
    List<BlockEntry> path = new ArrayList<>(design.path());
    int from = indexOf(design, blockId);
    if (from < 0 || to < 0 || to >= path.size() || from == to) {
      return Optional.empty();
    }
    path.add(to, path.remove(from));
    KitDesign after = design.withPath(Collections.unmodifiableList(path));
    return standings.noWorse(design, after) ? Optional.of(after) : Optional.empty();
  }

  /** The place of a block in the path; -1 beside it. */
  public static int indexOf(KitDesign design, String blockId) {
    return design.path().stream().map(BlockEntry::id).toList().indexOf(blockId);
  }

  /** A new id: the role's word, with a number where it is taken. */
  private static String freshId(KitDesign design, BlockType type) {
    String word = Words.of("id." + type.role().name().toLowerCase(Locale.ROOT).replace('_', '-'));
    String id = word;
    for (int i = 2; design.block(id).isPresent(); i++) {
      id = word + "-" + i;
    }
    return id;
  }
}

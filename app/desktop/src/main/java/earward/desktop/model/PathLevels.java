package earward.desktop.model;

import earward.block.BlockType;
import earward.block.Role;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.Wiring;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads the level diagram off a design and its readings; nothing is worked out that was not solved.
 */
public final class PathLevels {
  private static final CaseName SHOWN = CaseName.TEST;

  private final Workshop workshop;
  private final KitDesign design;
  private final Readings readings;

  private PathLevels(Workshop workshop, KitDesign design, Readings readings) {
    this.workshop = workshop;
    this.design = design;
    this.readings = readings;
  }

  /** The cards of the path in its order, ghosts for what it still needs among them. */
  public static List<LevelCard> of(Workshop workshop, KitDesign design, Readings readings) {
    return new PathLevels(workshop, design, readings).cards();
  }

  /** Supplies and take-offs; a ghost where there is no supply. */
  public static List<SideCard> beside(Workshop workshop, KitDesign design, Readings readings) {
    return new PathLevels(workshop, design, readings).sides();
  }

  private List<LevelCard> cards() {
    List<LevelCard> cards = new ArrayList<>();
    boolean fed = false;
    boolean detected = false;
    boolean loaded = false;
    for (BlockEntry entry : design.path()) {
      Optional<BlockType> type = workshop.types().find(entry.typeId());
      if (type.isEmpty()) {
        cards.add(LevelCard.missing(entry.id(), entry.typeId()));
        detected = true; // what a missing block is nobody knows: no ghost for it
        fed = true;
        loaded = true;
        continue;
      }
      Role role = type.get().role();
      fed |= role == Role.FEED;
      detected |= role == Role.DETECTOR;
      loaded |= role == Role.LOAD;
      cards.add(card(entry, type.get(), !detected));
    }
    if (!fed) {
      cards.add(0, LevelCard.ghost("feed"));
    }
    if (!detected) {
      cards.add(Math.min(1, cards.size()), LevelCard.ghost("detector"));
    }
    if (!loaded) {
      cards.add(LevelCard.ghost("load"));
    }
    return cards;
  }

  private LevelCard card(BlockEntry entry, BlockType type, boolean carrier) {
    Quantity quantity = carrier ? Quantity.CARRIER_RMS_VOLTS : Quantity.AUDIO_RMS_VOLTS;
    boolean end =
        readings
            .assembly()
            .flatMap(assembly -> assembly.block(entry.id()))
            .map(PlacedBlock::description)
            .map(description -> description.wiring())
            .flatMap(Wiring::exit)
            .isEmpty();
    ShownFigure level = readings.find(end ? "path" : entry.id(), quantity, SHOWN);
    ShownFigure headroom = readings.find("seam." + entry.id(), Quantity.HEADROOM_DECIBELS, SHOWN);
    ShownFigure noise = readings.find("seam." + entry.id(), Quantity.NOISE_RMS_VOLTS, SHOWN);
    String words =
        level.known()
            ? Words.of(carrier ? "path.carrier" : "path.audio", level.text(Unit.VOLT))
            : "";
    return new LevelCard(
        entry.id(),
        name(type),
        LevelCard.Kind.BLOCK,
        words,
        Amounts.decibelsVolt(level.value()),
        headroom.value(),
        Amounts.decibelsVolt(noise.value()),
        level.standing());
  }

  private List<SideCard> sides() {
    List<SideCard> cards = new ArrayList<>();
    design.supplies().forEach(entry -> cards.add(side(entry)));
    if (cards.isEmpty()) {
      cards.add(
          new SideCard(
              "supply", Words.of("ghost.supply"), LevelCard.Kind.GHOST, Words.of("ghost.add"), ""));
    }
    design.takeOffs().forEach(entry -> cards.add(side(entry)));
    return cards;
  }

  private SideCard side(BlockEntry entry) {
    Optional<BlockType> type = workshop.types().find(entry.typeId());
    String joins = entry.joinsAt().map(node -> node.replaceAll("\\..*", "")).orElse("");
    if (type.isEmpty()) {
      return new SideCard(
          entry.id(), entry.typeId(), LevelCard.Kind.MISSING, Words.of("path.missing"), joins);
    }
    return new SideCard(entry.id(), name(type.get()), LevelCard.Kind.BLOCK, says(entry), joins);
  }

  /** The current of a supply; the voltage of a take-off's first test point. */
  private String says(BlockEntry entry) {
    ShownFigure amperes = readings.find(entry.id(), Quantity.SUPPLY_AMPERES, SHOWN);
    if (amperes.known()) {
      return amperes.text(Unit.AMPERE);
    }
    return readings.assembly().map(Assembly::testPoints).orElse(List.of()).stream()
        .filter(point -> point.place().startsWith(entry.id() + "."))
        .map(point -> readings.find(point.place(), Quantity.DC_VOLTS, SHOWN))
        .filter(ShownFigure::known)
        .map(figure -> Amounts.reading(figure.value(), Unit.VOLT))
        .findFirst()
        .orElse("");
  }

  private static String name(BlockType type) {
    return Texts.of(type).get("name");
  }
}

package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.Role;
import earward.desktop.TestWorkshop;
import earward.desktop.view.NewKit;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class PathEditsTest {
  private Workshop workshop;
  private PathEdits path;
  private KitDesign lantern;

  @BeforeEach
  void read() throws DesignFileException {
    workshop = TestWorkshop.open();
    path = new PathEdits(workshop);
    lantern = Designs.read(TestWorkshop.kit("lantern")).design();
  }

  private static List<Role> roles(List<BlockOffer> offers) {
    return offers.stream().map(BlockOffer::role).distinct().toList();
  }

  @Test
  void aBlockIsOfferedOnlyWhereItCanStand() {
    assertThat(roles(path.offers(lantern, 0))).isEmpty();
    assertThat(roles(path.offers(lantern, 3)))
        .contains(Role.AUDIO_FILTER, Role.VOLUME)
        .doesNotContain(Role.FEED, Role.DETECTOR, Role.POWER, Role.LOAD);
    assertThat(roles(path.offers(lantern, 6))).doesNotContain(Role.VOLUME, Role.LOAD);
  }

  @Test
  void anEmptyPathTakesAFeedOrADetectorThatBringsOne() {
    KitDesign empty = NewKit.design();
    assertThat(roles(path.offers(empty, 0))).containsExactly(Role.FEED, Role.DETECTOR);
    BlockOffer detector =
        path.offers(empty, 0).stream().filter(o -> o.role() == Role.DETECTOR).findFirst().get();
    KitDesign begun =
        path.inserted(empty, 0, workshop.types().find(detector.typeId()).get()).orElseThrow();
    assertThat(begun.path()).extracting(BlockEntry::id).containsExactly("feed", "detector");
    assertThat(PathLevels.of(workshop, begun, Readings.NONE))
        .extracting(LevelCard::kind)
        .containsExactly(LevelCard.Kind.BLOCK, LevelCard.Kind.BLOCK, LevelCard.Kind.GHOST);
  }

  @Test
  void aReplacementKeepsTheIdAndTheSettingsThatSuitIt() {
    List<BlockOffer> offers = path.replacements(lantern, "filter");
    assertThat(offers).isNotEmpty().noneMatch(o -> o.typeId().equals("filter.carrier-rc"));
    KitDesign after =
        path.replaced(lantern, "filter", workshop.types().find(offers.get(0).typeId()).get())
            .orElseThrow();
    assertThat(after.block("filter").orElseThrow().typeId()).isEqualTo(offers.get(0).typeId());
    assertThat(after.path()).hasSameSizeAs(lantern.path());
  }

  @Test
  void aBlockMovesOnlyToWhereItCanStand() {
    assertThat(path.moved(lantern, "filter", 3)).isPresent();
    assertThat(path.moved(lantern, "filter", 0)).isEmpty();
    assertThat(path.moved(lantern, "loudspeaker", 2)).isEmpty();
  }

  @Test
  void aMissingPlugInIsACardThatKeepsItsSettings() throws DesignFileException {
    KitDesign strange =
        lantern.withPath(
            lantern.path().stream()
                .map(
                    block ->
                        block.id().equals("filter")
                            ? BlockEntry.of("filter", "filter.reedbank-shelf").with("r2", "1 kΩ")
                            : block)
                .toList());
    assertThat(PathLevels.of(workshop, strange, Readings.NONE))
        .filteredOn(card -> card.kind() == LevelCard.Kind.MISSING)
        .extracting(LevelCard::id)
        .containsExactly("filter");
    KitDesign back = Designs.read(Designs.text(strange), "strange.earward").design();
    assertThat(back.block("filter").orElseThrow().settings()).containsKey("r2");
  }

  @Test
  void aTakeOffJoinsAtTheDetectorAndASupplyStandsBeside() {
    KitDesign bare = lantern.withoutBlock("agc").withoutBlock("battery");
    KitDesign more = bare;
    for (BlockOffer offer : path.besides()) {
      more = path.addedBeside(more, workshop.types().find(offer.typeId()).get());
    }
    assertThat(more.supplies()).isNotEmpty();
    assertThat(more.takeOffs())
        .isNotEmpty()
        .allMatch(block -> block.joinsAt().orElse("").startsWith("detector."));
  }
}

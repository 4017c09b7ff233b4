package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What the kit makes of blocks that go together, and of such as do not. */
class AssemblyTest {
  private static List<String> stops(KitDesign design) {
    Assembly assembly = TestKits.assembled(design);
    assertThat(assembly.complete()).isFalse();
    return assembly.findings().stream()
        .filter(f -> f.severity() == Severity.STOP)
        .map(Finding::code)
        .toList();
  }

  private static KitDesign lantern() {
    return TestKits.starter("lantern");
  }

  @Test
  void aBlockThatIsMissingIsSaidOnceAndNothingThatFollowsFromIt() {
    for (BlockEntry block : lantern().blocks()) {
      KitDesign design =
          lantern()
              .withBlock(
                  block.id(),
                  old ->
                      new BlockEntry(
                          old.id(),
                          "nobody.offers-this",
                          old.settings(),
                          old.rails(),
                          old.joinsAt(),
                          old.written()));
      assertThat(stops(design)).as(block.id()).containsExactly("unknown-block");
    }
  }

  @Test
  void blocksStandInTheOrderOfTheSignal() {
    KitDesign two = lantern().addBlock(2, BlockEntry.of("second", "detector.envelope-diode"));
    assertThat(stops(two)).contains("path-order");
    KitDesign late = lantern().addBlock(5, BlockEntry.of("late", "filter.carrier-rc"));
    assertThat(stops(late)).contains("path-order");
    KitDesign beside = lantern().addBlock(2, BlockEntry.of("spare", "supply.battery"));
    assertThat(stops(beside)).contains("path-order");
  }

  @Test
  void aPairDoesNotEndInOneWire() {
    KitDesign single = lantern().withSetting("loudspeaker", "driven-by", "single");
    assertThat(stops(single)).containsExactly("port-mismatch");
  }

  @Test
  void aRailIsOfferedOnceAndTakenWhereItIsOffered() {
    KitDesign none = lantern().withoutBlock("battery");
    assertThat(stops(none)).containsExactly("rail-missing");
    KitDesign two = lantern().addSupply(BlockEntry.of("second", "supply.battery"));
    assertThat(stops(two)).containsExactly("rail-twice");
    KitDesign other = lantern().withBlock("power", block -> block.withRail("main", "quiet"));
    assertThat(stops(other)).containsExactly("rail-missing");
  }

  @Test
  void aTakeOffHangsOnANodeThatThereIs() {
    KitDesign nowhere = lantern().withBlock("agc", block -> block.joiningAt("detector.outt"));
    assertThat(stops(nowhere)).containsExactly("take-off-unjoined");
  }

  @Test
  void aNameThatTheKitKeepsForItselfIsRefused() {
    KitDesign design = lantern().addTakeOff(BlockEntry.of("seam", "take-off.agc"));
    assertThat(stops(design)).containsExactly("reserved-name");
  }

  @Test
  void aSettingThatTheTypeDoesNotHaveIsKeptAndNoted() {
    KitDesign design = lantern().withSetting("filter", "r22", "1 kΩ");
    Assembly assembly = TestKits.assembled(design);
    assertThat(assembly.complete()).isTrue();
    assertThat(assembly.findings())
        .filteredOn(f -> f.code().equals("unknown-setting"))
        .extracting(Finding::severity)
        .containsExactly(Severity.NOTE);
    assertThat(assembly.design().block("filter").orElseThrow().settings()).containsKey("r22");
  }

  static Stream<Arguments> shortened() {
    return Stream.of("lantern", "hayloft", "boathouse")
        .flatMap(
            name ->
                IntStream.rangeClosed(1, TestKits.starter(name).path().size() - 1)
                    .mapToObj(blocks -> Arguments.of(name, blocks)));
  }

  @ParameterizedTest
  @MethodSource("shortened")
  void aPathMayEndAfterAnyBlockAndIsSolvedAsItIs(String name, int blocks) {
    KitDesign design = TestKits.starter(name);
    for (BlockEntry block : design.path().subList(blocks, design.path().size())) {
      design = design.withoutBlock(block.id());
    }
    if (blocks == 1) {
      for (BlockEntry takeOff : design.takeOffs()) {
        design = design.withoutBlock(takeOff.id());
      }
    }
    SolvedKit kit = KitSolver.solve(TestKits.assembled(design));
    assertThat(kit.findings()).isEmpty();
    assertThat(kit.solved()).isTrue();
    assertThat(kit.assembly().complete()).isTrue();
    assertThat(kit.figures().all()).isNotEmpty();
  }
}

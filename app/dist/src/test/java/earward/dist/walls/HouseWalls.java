package earward.dist.walls;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static earward.dist.walls.Known.in;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.library.dependencies.SliceAssignment;
import com.tngtech.archunit.library.dependencies.SliceIdentifier;
import java.util.List;
import java.util.Set;

/** Walls that run through more than one room. */
final class HouseWalls {
  private static final DescribedPredicate<JavaClass> FILES =
      describe(
          "files",
          type ->
              type.getPackageName().startsWith("java.nio.file")
                  || type.getName().matches("java\\.io\\.(File.*|RandomAccessFile)"));
  private static final DescribedPredicate<JavaClass> CLOCK_TYPES =
      describe(
          "clocks", type -> type.getName().matches("java\\.(time\\.Clock|util\\.(Date|Timer))"));
  private static final Set<String> CLOCK_CALLS =
      Set.of("now", "currentTimeMillis", "nanoTime", "getInstance");
  private static final DescribedPredicate<JavaCall<?>> READS_CLOCK =
      describe(
          "reads a clock",
          call ->
              CLOCK_CALLS.contains(call.getName())
                  && call.getTargetOwner()
                      .getName()
                      .matches("java\\.(time\\..*|lang\\.System|util\\.Calendar)"));

  /** Their order changes from one process to the next; what is drawn or printed must not. */
  private static final DescribedPredicate<JavaCall<?>> LOSES_ORDER =
      describe(
          "makes a set or a map without an order",
          call ->
              (call.getName().equals("copyOf")
                      && call.getTargetOwner().getName().matches("java\\.util\\.(Set|Map)"))
                  || (call.getName().matches("to(Unmodifiable)?(Set|Map)|groupingBy")
                      && call.getTargetOwner().getName().equals("java.util.stream.Collectors")));

  private HouseWalls() {}

  static List<Wall> all() {
    return List.of(
        new Wall(
            "no files in engine, study, path, review and proposal",
            noClasses()
                .that(
                    in("earward.engine", "earward.study")
                        .or(in("earward.kit.path", "earward.kit.review", "earward.kit.proposal")))
                .should()
                .dependOnClassesThat(FILES),
            earward.engine.fixture.ReadsFile.class),
        new Wall(
            "no clock type in the engine",
            noClasses().that(in("earward.engine")).should().dependOnClassesThat(CLOCK_TYPES),
            earward.engine.fixture.HoldsClock.class),
        new Wall(
            "no clock is read in the engine",
            noClasses().that(in("earward.engine")).should().callCodeUnitWhere(READS_CLOCK),
            earward.engine.fixture.ReadsClock.class),
        new Wall(
            "the full waveform shares no code with carrier-averaged detection",
            noClasses()
                .that(in("earward.engine.waveform"))
                .should()
                .dependOnClassesThat(in("earward.engine.detection")),
            earward.engine.waveform.fixture.Averages.class),
        new Wall(
            "what is drawn or printed keeps its order",
            noClasses()
                .that(in("earward.drawing", "earward.sheet"))
                .should()
                .callCodeUnitWhere(LOSES_ORDER),
            earward.drawing.fixture.LosesOrder.class),
        new Wall(
            "JSON in kit.file and command alone",
            noClasses()
                .that(not(in("earward.kit.file", "earward.command")))
                .should()
                .dependOnClassesThat(in("com.fasterxml.jackson", "com.networknt")),
            earward.kit.review.fixture.WritesJson.class),
        new Wall(
            "no third-party type in a public signature of block-api, kit, engine and study",
            classes()
                .that(in("earward.block", "earward.kit", "earward.engine", "earward.study"))
                .and(not(in("earward.block.testkit")))
                .should(new OwnSignatures()),
            earward.study.fixture.HandsOutVector.class),
        new Wall(
            "internal packages are used by their own room alone",
            classes().should(new InternalStaysInside()),
            earward.command.fixture.ReachesIn.class,
            earward.study.fixture.internal.Inner.class),
        new Wall(
            "no cycles between packages",
            slices().assignedFrom(new BySubject()).should().beFreeOfCycles(),
            earward.study.fixture.east.East.class,
            earward.study.fixture.west.West.class));
  }

  /** One slice a package; what is internal belongs to the package that it is internal to. */
  private static final class BySubject implements SliceAssignment {
    @Override
    public String getDescription() {
      return "packages by subject";
    }

    @Override
    public SliceIdentifier getIdentifierOf(JavaClass type) {
      String name = type.getPackageName();
      if (!Known.isIn(name, "earward")) {
        return SliceIdentifier.ignore();
      }
      return SliceIdentifier.of(name.replaceFirst("\\.internal(\\..*)?$", ""));
    }
  }
}

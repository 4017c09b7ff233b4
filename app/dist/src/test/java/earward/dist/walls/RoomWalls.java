package earward.dist.walls;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static earward.dist.walls.Known.JAVA_BASE;
import static earward.dist.walls.Known.JDK;
import static earward.dist.walls.Known.JDK_WITHOUT_DESKTOP;
import static earward.dist.walls.Known.WIDGETS;
import static earward.dist.walls.Known.in;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.List;

/** What each room may use: the table of rooms, row by row. */
final class RoomWalls {
  static final String[] PLUGINS = {
    "earward.feeds",
    "earward.detectors",
    "earward.filters",
    "earward.volume",
    "earward.preamplifiers",
    "earward.power",
    "earward.supplies",
    "earward.takeoffs",
    "earward.loads"
  };
  private static final String TESTKIT_PACKAGE = "earward.block.testkit";
  private static final DescribedPredicate<JavaClass> TESTKIT = in(TESTKIT_PACKAGE);
  private static final DescribedPredicate<JavaClass> API = in("earward.block").and(not(TESTKIT));
  private static final DescribedPredicate<JavaClass> DOCUMENT =
      in("earward.kit.design", "earward.kit.parts", "earward.kit.file");

  private RoomWalls() {}

  static List<Wall> all() {
    List<Wall> walls = new ArrayList<>(inner());
    walls.addAll(outer());
    for (String plugin : PLUGINS) {
      walls.add(
          new Wall(
              plugin + " uses block-api and the JDK without java.desktop",
              only(in(plugin), in(plugin).or(API).or(JDK_WITHOUT_DESKTOP)),
              offenderIn(plugin)));
    }
    return walls;
  }

  private static List<Wall> inner() {
    return List.of(
        new Wall(
            "block-api uses java.base",
            only(API, API.or(JAVA_BASE)),
            earward.block.fixture.Logs.class),
        new Wall(
            "block-testkit uses engine, kit, drawing and JUnit",
            only(
                TESTKIT,
                in("earward.block", "earward.engine", "earward.kit", "earward.drawing")
                    .or(in("org.junit", "org.assertj", "org.opentest4j", "org.apiguardian"))
                    .or(JDK.and(not(WIDGETS)))),
            earward.block.testkit.fixture.OpensWindow.class),
        new Wall(
            "engine uses block-api and Commons Math",
            only(
                in("earward.engine"),
                in("earward.engine", "org.apache.commons.math3").or(API).or(JDK_WITHOUT_DESKTOP)),
            earward.engine.fixture.KnowsKit.class),
        new Wall(
            "the document does not use the engine",
            only(
                DOCUMENT, DOCUMENT.or(API).or(in("com.fasterxml.jackson")).or(JDK_WITHOUT_DESKTOP)),
            earward.kit.design.fixture.Solves.class),
        new Wall(
            "path, review and proposal use the document and the engine, never the files",
            only(
                in("earward.kit").and(not(DOCUMENT)),
                in("earward.kit", "earward.engine")
                    .and(not(in("earward.kit.file")))
                    .or(API)
                    .or(JDK_WITHOUT_DESKTOP)),
            earward.kit.path.fixture.KnowsFile.class),
        new Wall(
            "study uses kit and engine",
            only(
                in("earward.study"),
                in("earward.study", "earward.kit", "earward.engine")
                    .or(API)
                    .or(JDK_WITHOUT_DESKTOP)),
            earward.study.fixture.Paints.class));
  }

  private static List<Wall> outer() {
    return List.of(
        new Wall(
            "host uses block-api and the JDK, no window",
            only(in("earward.host"), in("earward.host").or(API).or(JDK_WITHOUT_DESKTOP)),
            earward.host.fixture.OpensDialog.class),
        new Wall(
            "drawing uses java.awt without widgets and a plotting library",
            only(
                in("earward.drawing"),
                in("earward.drawing", "org.jfree").or(API).or(JDK.and(not(WIDGETS)))),
            earward.drawing.fixture.DrawsOnPanel.class,
            earward.drawing.fixture.KnowsKit.class),
        new Wall(
            "sheet prints what it is given",
            only(
                in("earward.sheet"),
                in("earward.sheet", "earward.kit", "earward.study", "earward.drawing")
                    .or(in("com.lowagie"))
                    .or(API)
                    .or(JDK.and(not(WIDGETS)))),
            earward.sheet.fixture.Solves.class),
        new Wall(
            "desktop does not use command",
            noClasses()
                .that(in("earward.desktop"))
                .should()
                .dependOnClassesThat(in("earward.command")),
            earward.desktop.fixture.KnowsCommand.class),
        new Wall(
            "no widget in desktop.model",
            noClasses().that(in("earward.desktop.model")).should().dependOnClassesThat(WIDGETS),
            earward.desktop.model.fixture.HoldsLabel.class),
        new Wall(
            "widgets in the desktop alone",
            noClasses().that(not(in("earward.desktop"))).should().dependOnClassesThat(WIDGETS),
            earward.command.fixture.ShowsMessage.class));
  }

  private static ArchRule only(
      DescribedPredicate<JavaClass> room, DescribedPredicate<JavaClass> allowed) {
    return classes().that(room).should().onlyDependOnClassesThat(allowed);
  }

  private static Class<?> offenderIn(String plugin) {
    try {
      return Class.forName(plugin + ".fixture.LooksAround");
    } catch (ClassNotFoundException e) {
      throw new IllegalStateException("each plug-in has a class that breaks its wall", e);
    }
  }
}

package earward.dist.walls;

import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The walls of the house, over every class that is shipped, and each seen to give way. */
class WallsTest {
  /** Rooms that hold code; a wall round an empty room proves nothing. */
  private static final List<String> ROOMS =
      List.of("earward.block", "earward.engine", "earward.kit", "earward.host", "earward.command");

  private static JavaClasses house;

  @BeforeAll
  static void readTheHouse() {
    house =
        new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("earward");
  }

  static Stream<Wall> walls() {
    return Stream.concat(RoomWalls.all().stream(), HouseWalls.all().stream());
  }

  @ParameterizedTest
  @MethodSource("walls")
  void theWallStands(Wall wall) {
    wall.rule().check(house);
  }

  @ParameterizedTest
  @MethodSource("walls")
  void theWallGoesRedWhenItIsBroken(Wall wall) {
    assertThat(wall.offenders()).isNotEmpty();
    assertThat(wall.offenders())
        .allMatch(offender -> offender.getPackageName().contains(".fixture"));
    JavaClasses broken = new ClassFileImporter().importClasses(wall.offenders());
    assertThat(wall.rule().evaluate(broken).hasViolation()).as(wall.name()).isTrue();
  }

  @Test
  void thereWasMuchToSeeInEveryRoom() {
    assertThat(house.size()).isGreaterThan(150);
    for (String room : ROOMS) {
      assertThat(house.stream().filter(Known.in(room)).filter(t -> !isPackageInfo(t.getName())))
          .as(room)
          .isNotEmpty();
    }
    assertThat(house.stream().filter(type -> type.getPackageName().contains(".fixture"))).isEmpty();
  }

  private static boolean isPackageInfo(String className) {
    return className.endsWith(".package-info");
  }
}

package earward.dist.walls;

import com.tngtech.archunit.lang.ArchRule;
import java.util.List;

/**
 * One wall of the house, and the classes that were written to break it.
 *
 * @param name what it says
 * @param rule that enforces it
 * @param offenders together they break it
 */
record Wall(String name, ArchRule rule, List<Class<?>> offenders) {
  Wall(String name, ArchRule rule, Class<?>... offenders) {
    this(name, rule.as(name).allowEmptyShould(true), List.of(offenders));
  }

  @Override
  public String toString() {
    return name;
  }
}

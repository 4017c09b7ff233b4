package earward.dist.walls;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;

/** A package {@code x.internal} is used from {@code x} and from within, by nobody else. */
final class InternalStaysInside extends ArchCondition<JavaClass> {
  InternalStaysInside() {
    super("use no other package's internals");
  }

  @Override
  public void check(JavaClass type, ConditionEvents events) {
    for (Dependency use : type.getDirectDependenciesFromSelf()) {
      String used = use.getTargetClass().getBaseComponentType().getPackageName();
      int internal = (used + ".").indexOf(".internal.");
      if (Known.isIn(used, "earward")
          && internal >= 0
          && !Known.isIn(type.getPackageName(), used.substring(0, internal))) {
        events.add(SimpleConditionEvent.violated(use, use.getDescription()));
      }
    }
  }
}

package earward.dist.walls;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaCodeUnit;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.domain.JavaMember;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.domain.JavaType;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.util.ArrayList;
import java.util.List;

/** What others can see of a public class names the JDK and the house alone. */
final class OwnSignatures extends ArchCondition<JavaClass> {
  OwnSignatures() {
    super("show no third-party type");
  }

  @Override
  public void check(JavaClass type, ConditionEvents events) {
    if (!isPublic(type)) {
      return;
    }
    List<JavaType> shown = new ArrayList<>(type.getInterfaces());
    type.getSuperclass().ifPresent(shown::add);
    report(type.getName(), shown, events);
    for (JavaField field : type.getFields()) {
      if (isShown(field)) {
        report(field.getFullName(), List.of(field.getType()), events);
      }
    }
    for (JavaCodeUnit unit : type.getCodeUnits()) {
      if (isShown(unit)) {
        List<JavaType> signature = new ArrayList<>(unit.getParameterTypes());
        signature.add(unit.getReturnType());
        signature.addAll(unit.getExceptionTypes());
        report(unit.getFullName(), signature, events);
      }
    }
  }

  private static boolean isPublic(JavaClass type) {
    return type.getModifiers().contains(JavaModifier.PUBLIC)
        && !type.getPackageName().contains(".internal")
        && type.getEnclosingClass().map(OwnSignatures::isPublic).orElse(true);
  }

  private static boolean isShown(JavaMember member) {
    return member.getModifiers().contains(JavaModifier.PUBLIC)
        || member.getModifiers().contains(JavaModifier.PROTECTED);
  }

  private static void report(String where, List<JavaType> types, ConditionEvents events) {
    for (JavaType type : types) {
      for (JavaClass raw : type.getAllInvolvedRawTypes()) {
        if (!Known.JDK.test(raw) && !Known.in("earward").test(raw)) {
          events.add(SimpleConditionEvent.violated(raw, where + " shows " + raw.getName()));
        }
      }
    }
  }
}

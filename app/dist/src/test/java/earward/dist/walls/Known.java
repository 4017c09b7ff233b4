package earward.dist.walls;

import static com.tngtech.archunit.base.DescribedPredicate.describe;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import java.lang.module.ModuleFinder;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;

/** Sets of classes that the walls speak of. */
final class Known {
  private static final Set<String> BASE = packages("java.base"::equals);
  private static final Set<String> WITHOUT_DESKTOP = packages(name -> !name.equals("java.desktop"));
  private static final Set<String> ALL = packages(name -> true);

  /** java.base alone. */
  static final DescribedPredicate<JavaClass> JAVA_BASE = jdk("java.base", BASE);

  /** The JDK without java.desktop. */
  static final DescribedPredicate<JavaClass> JDK_WITHOUT_DESKTOP =
      jdk("the JDK without java.desktop", WITHOUT_DESKTOP);

  /** The whole JDK. */
  static final DescribedPredicate<JavaClass> JDK = jdk("the JDK", ALL);

  /** Windows, dialogs and all that is shown in them. */
  static final DescribedPredicate<JavaClass> WIDGETS =
      describe(
          "widgets",
          type ->
              type.getName().startsWith("javax.swing.")
                  || type.isAssignableTo("java.awt.Component")
                  || type.isAssignableTo("java.awt.MenuComponent"));

  private Known() {}

  /** The classes of these packages and of the packages within them. */
  static DescribedPredicate<JavaClass> in(String... roots) {
    return describe(
        "in " + String.join(", ", roots),
        type -> {
          for (String root : roots) {
            if (isIn(packageOf(type), root)) {
              return true;
            }
          }
          return false;
        });
  }

  static boolean isIn(String packageName, String root) {
    return packageName.equals(root) || packageName.startsWith(root + ".");
  }

  private static String packageOf(JavaClass type) {
    return type.getBaseComponentType().getPackageName();
  }

  private static DescribedPredicate<JavaClass> jdk(String name, Set<String> packages) {
    return describe(
        name,
        type ->
            type.getBaseComponentType().isPrimitive()
                || packages.contains(packageOf(type))
                // an annotation for the compiler only; nothing of it is needed at run time
                || packageOf(type).equals("org.jspecify.annotations"));
  }

  private static Set<String> packages(Predicate<String> modules) {
    return ModuleFinder.ofSystem().findAll().stream()
        .map(module -> module.descriptor())
        .filter(module -> modules.test(module.name()))
        .flatMap(module -> module.packages().stream())
        .collect(Collectors.toUnmodifiableSet());
  }
}

package earward.block.mark;

import java.lang.annotation.Documented;
import java.lang.annotation.ElementType;
import java.lang.annotation.Target;

/** Marks a package that block authors may build against: it changes only with the API version. */
@Documented
@Target({ElementType.PACKAGE, ElementType.TYPE})
public @interface Offered {
  /** API version since which it has been so. */
  int since();
}

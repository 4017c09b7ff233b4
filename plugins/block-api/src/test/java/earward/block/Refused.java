package earward.block;

import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.DynamicTest.dynamicTest;

import java.util.function.Supplier;
import org.junit.jupiter.api.DynamicTest;

/** A constructor that must refuse its arguments, in a sentence that names what is wrong. */
public final class Refused {
  private Refused() {}

  /**
   * A test that passes when making the thing throws IllegalArgumentException and its message holds
   * all the words.
   */
  public static DynamicTest refused(String name, Supplier<Object> making, String... words) {
    return dynamicTest(
        name,
        () ->
            assertThatThrownBy(making::get)
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContainingAll(words));
  }
}

package earward.kit.design;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * How one object of a design file was written: its members in their order, each with its JSON text.
 * It keeps what the program does not know, and the words in which known values were given ({@code
 * "0,047 µF"} stays {@code "0,047 µF"} as long as the value is not edited).
 *
 * <p>Immutable. Known objects and arrays inside have their own; their text here is empty.
 *
 * @param members JSON text by member name, in the order of the file
 */
public record AsWritten(Map<String, String> members) {
  /** Nothing was written: the object was made by the program. */
  public static final AsWritten NEW = new AsWritten(Map.of());

  public AsWritten {
    members = Collections.unmodifiableMap(new LinkedHashMap<>(members));
  }

  /** The JSON text of a member; empty where it was not written or is kept elsewhere. */
  public Optional<String> text(String member) {
    return Optional.ofNullable(members.get(member)).filter(text -> !text.isEmpty());
  }

  /** Whether the file had this member. */
  public boolean has(String member) {
    return members.containsKey(member);
  }
}

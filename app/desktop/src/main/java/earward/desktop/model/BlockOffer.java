package earward.desktop.model;

import earward.block.Role;

/**
 * A block type that may stand in a place.
 *
 * @param typeId of the type
 * @param name of the type
 * @param help what it says of itself; may be empty
 * @param role what it is for
 */
public record BlockOffer(String typeId, String name, String help, Role role) {
  /** What the role is called. */
  public String roleName() {
    return Words.of("role." + role.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-'));
  }

  /** Whether all the words that were typed occur in it. */
  public boolean matches(String typed) {
    String all = (name + " " + roleName() + " " + typeId + " " + help).toLowerCase(Words.locale());
    for (String word : typed.toLowerCase(Words.locale()).strip().split("\\s+")) {
      if (!all.contains(word)) {
        return false;
      }
    }
    return true;
  }
}

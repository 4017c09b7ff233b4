package earward.desktop.model;

/**
 * A supply or a take-off beside the path.
 *
 * @param id of the block; for a ghost, the word of the role that is wanted
 * @param title its name
 * @param kind what it stands for
 * @param says its main figure, as people write it; may be empty
 * @param joinsAt the block of the path under which it hangs; empty for a supply
 */
public record SideCard(String id, String title, LevelCard.Kind kind, String says, String joinsAt) {}

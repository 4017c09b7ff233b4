package earward.desktop.model;

/**
 * A supply or a take-off beside the path.
 *
 * @param id of the block
 * @param title its name
 * @param says its main figure, as people write it; may be empty
 */
public record SideCard(String id, String title, String says) {}

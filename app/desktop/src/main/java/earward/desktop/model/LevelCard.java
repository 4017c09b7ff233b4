package earward.desktop.model;

/**
 * One card of the level diagram.
 *
 * @param id what it selects; for a ghost, the word of the role that is wanted there
 * @param title its name
 * @param kind whether it is a block, one whose plug-in is missing, or a ghost
 * @param level where the block is left, in words; empty where there is none
 * @param decibelsVolt the same in dB over 1 V rms; NaN where it is not known
 * @param headroomDecibels by how much the level may rise before the output clips; NaN where unknown
 * @param noiseDecibelsVolt the noise there in dB over 1 V rms; NaN where it is not known
 * @param standing of the level
 */
public record LevelCard(
    String id,
    String title,
    Kind kind,
    String level,
    double decibelsVolt,
    double headroomDecibels,
    double noiseDecibelsVolt,
    Standing standing) {
  /** What a card stands for. */
  public enum Kind {
    BLOCK,
    /** A block that no plug-in offers: its settings are kept. */
    MISSING,
    /** What is wanted here and is not there yet. */
    GHOST
  }

  static LevelCard ghost(String role) {
    return new LevelCard(
        role,
        Words.of("ghost." + role),
        Kind.GHOST,
        Words.of("ghost.add"),
        Double.NaN,
        Double.NaN,
        Double.NaN,
        Standing.NONE);
  }

  static LevelCard missing(String id, String typeId) {
    return new LevelCard(
        id,
        typeId,
        Kind.MISSING,
        Words.of("path.missing"),
        Double.NaN,
        Double.NaN,
        Double.NaN,
        Standing.NONE);
  }
}

package earward.desktop.model;

/**
 * One block of the path in the level diagram.
 *
 * @param id of the block
 * @param title its name
 * @param carrier whether its level is that of the carrier rather than of the recovered audio
 * @param decibelsVolt level where the block is left, dB over 1 V rms; NaN where it is not known
 * @param level the same as people write it
 * @param headroomDecibels by how much the level may rise before the output clips; NaN where unknown
 */
public record LevelCard(
    String id,
    String title,
    boolean carrier,
    double decibelsVolt,
    String level,
    double headroomDecibels) {}

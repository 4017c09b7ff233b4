package earward.block.device;

/** The figures of one part type from the parts library, or given inline in a design. Immutable. */
public sealed interface PartModel
    permits DiodeModel,
        AmplifierModel,
        LoudspeakerModel,
        BatteryModel,
        AdaptorModel,
        RegulatorModel,
        TransistorModel,
        FieldEffectModel,
        OpAmpModel {
  /** The part type's name as printed in the parts list. */
  String name();

  /** What kind of part it is. */
  PartKind kind();
}

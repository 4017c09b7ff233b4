package earward.block.device;

/** The kinds of part that the parts library knows; a part setting asks for one of them. */
public enum PartKind {
  DIODE("diode"),
  AMPLIFIER("amplifier"),
  LOUDSPEAKER("loudspeaker"),
  BATTERY("battery"),
  ADAPTOR("adaptor"),
  REGULATOR("regulator"),
  TRANSISTOR("transistor"),
  FIELD_EFFECT_TRANSISTOR("field-effect-transistor"),
  OP_AMP("op-amp");

  private final String key;

  PartKind(String key) {
    this.key = key;
  }

  /** The kind as written in files. */
  public String key() {
    return key;
  }
}

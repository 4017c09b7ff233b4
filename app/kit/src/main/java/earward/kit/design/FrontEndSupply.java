package earward.kit.design;

/** What powers the front end: an answer that every design must give. */
public enum FrontEndSupply {
  BATTERY("battery"),
  /** A mains adaptor with a safety extra-low voltage output. */
  SELV_ADAPTOR("selv adaptor"),
  /** Anything else, the mains and a live chassis among it: refused. */
  OTHER("other"),
  /** The design does not say. */
  NOT_ANSWERED("not answered");

  private final String key;

  FrontEndSupply(String key) {
    this.key = key;
  }

  /** The answer as written in files. */
  public String key() {
    return key;
  }

  /** Whether a kit may be joined to a front end that is powered so. */
  public boolean allowed() {
    return this == BATTERY || this == SELV_ADAPTOR;
  }
}

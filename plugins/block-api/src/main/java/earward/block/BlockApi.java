package earward.block;

/** The version of what block authors build against. */
public final class BlockApi {
  /** What a plug-in's manifest must say in {@link #MANIFEST_VERSION}. */
  public static final String VERSION = "1";

  public static final String MANIFEST_VERSION = "Block-Api-Version";
  public static final String MANIFEST_PLUGIN_ID = "Plugin-Id";
  public static final String MANIFEST_PLUGIN_VERSION = "Plugin-Version";

  private BlockApi() {}
}

package earward.host;

import earward.block.BlockApi;
import earward.block.check.Finding;
import earward.block.check.Severity;
import java.nio.file.Path;
import java.util.ServiceConfigurationError;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/** The sentences of the host: each names the jar, what was wanted and what was found. */
final class Refusals {
  private static final Pattern CLASS_FILE_VERSION = Pattern.compile("class file version (\\d+)");
  private static final int JAVA_BEFORE_FIRST = 44;

  private Refusals() {}

  static Finding noFolder(Path folder) {
    return refusal("plugin-folder", folder, "There is no plug-in folder " + folder + ".");
  }

  static Finding folderUnreadable(Path folder, Exception why) {
    return refusal(
        "plugin-folder", folder, "The plug-in folder " + folder + " cannot be read: " + why(why));
  }

  static Finding unreadable(Path jar, Exception why) {
    return refusal("plugin-unreadable", jar, name(jar) + " cannot be read as a jar: " + why(why));
  }

  static Finding noManifest(Path jar) {
    return refusal(
        "plugin-manifest",
        jar,
        name(jar)
            + " has no manifest; a plug-in's manifest says "
            + BlockApi.MANIFEST_VERSION
            + ", "
            + BlockApi.MANIFEST_PLUGIN_ID
            + " and "
            + BlockApi.MANIFEST_PLUGIN_VERSION
            + ".");
  }

  static Finding noAttribute(Path jar, String attribute) {
    return refusal(
        "plugin-manifest",
        jar,
        name(jar) + " lacks " + attribute + " in its manifest; every plug-in must give it.");
  }

  static Finding otherApi(Path jar, String found) {
    return refusal(
        "plugin-api-version",
        jar,
        name(jar)
            + " was built for block-api "
            + found
            + "; this program offers "
            + BlockApi.VERSION
            + ".");
  }

  static Finding noServiceFile(Path jar, String wanted) {
    return refusal(
        "plugin-no-service-file",
        jar,
        name(jar) + " has no " + wanted + "; that file names the block types, one a line.");
  }

  static Finding emptyServiceFile(Path jar, String wanted) {
    return refusal(
        "plugin-empty-service-file",
        jar,
        name(jar) + " names no block type in " + wanted + "; at least one is wanted.");
  }

  static Finding duplicatePlugin(JarCheck.Promise promise, Plugin first) {
    return refusal(
        "plugin-duplicate",
        promise.jar(),
        promise.fileName()
            + " calls itself plug-in '"
            + promise.pluginId()
            + "', as "
            + name(first.jar())
            + " already does; an id belongs to one jar.");
  }

  static Finding duplicateType(JarCheck.Promise promise, String typeId, String other) {
    return refusal(
        "block-duplicate",
        promise.jar(),
        promise.fileName()
            + " offers block type '"
            + typeId
            + "', as "
            + other
            + " already does; the first is used.");
  }

  /** What a thrown thing says of a plug-in that is being loaded, as advice rather than a trace. */
  static Finding broken(JarCheck.Promise promise, String typeName, Throwable thrown) {
    Throwable root = root(thrown);
    String about = promise.fileName() + " (plug-in '" + promise.pluginId() + "')";
    String of = typeName.isEmpty() ? "" : " in " + typeName;
    if (root instanceof UnsupportedClassVersionError) {
      return refusal("plugin-newer-java", promise.jar(), about + newerJava(root));
    }
    if (root instanceof ClassNotFoundException || root instanceof NoClassDefFoundError) {
      return refusal(
          "plugin-class-missing",
          promise.jar(),
          about
              + " needs a class that it does not bring and may not use"
              + of
              + ": "
              + why(root)
              + ". A plug-in sees the JDK without java.desktop, block-api and itself.");
    }
    return refusal(
        "plugin-broken", promise.jar(), about + " cannot be loaded" + of + ": " + why(root));
  }

  private static String newerJava(Throwable root) {
    Matcher version = CLASS_FILE_VERSION.matcher(String.valueOf(root.getMessage()));
    String wanted =
        version.find()
            ? "Java " + (Integer.parseInt(version.group(1)) - JAVA_BEFORE_FIRST)
            : "a newer Java";
    return " wants " + wanted + "; this program runs on Java " + Runtime.version().feature() + ".";
  }

  static Finding threw(Guard guard, String call, Throwable thrown) {
    return refusal(
        "plugin-failed",
        Path.of(guard.fileName()),
        "Plug-in '" + guard.pluginId() + "' failed in " + call + ": " + why(thrown));
  }

  static Finding gaveNothing(Guard guard, String call) {
    return refusal(
        "plugin-failed",
        Path.of(guard.fileName()),
        "Plug-in '" + guard.pluginId() + "' gave null from " + call + "; a value is wanted.");
  }

  static Finding badTypeId(Guard guard, String className, String id) {
    return refusal(
        "block-id",
        Path.of(guard.fileName()),
        "Plug-in '"
            + guard.pluginId()
            + "' calls a block type '"
            + id
            + "' ("
            + className
            + "); an id is lower-case words joined by dots and hyphens.");
  }

  static Finding duplicateSetting(Guard guard, String typeId, String settingId) {
    return refusal(
        "block-settings",
        Path.of(guard.fileName()),
        "Plug-in '"
            + guard.pluginId()
            + "' gives block type '"
            + typeId
            + "' two settings '"
            + settingId
            + "'; each has its own id.");
  }

  private static Throwable root(Throwable thrown) {
    Throwable root = thrown;
    for (int depth = 0; depth < 10; depth++) {
      boolean wrapper =
          root instanceof ServiceConfigurationError || root instanceof ExceptionInInitializerError;
      Throwable cause = root.getCause();
      if (!wrapper || cause == null) {
        break;
      }
      root = cause;
    }
    return root;
  }

  private static String why(Throwable thrown) {
    @Nullable String message;
    try {
      message = thrown.getMessage();
    } catch (RuntimeException e) { // an exception class of a plug-in may be broken too
      message = null;
    }
    String kind = thrown.getClass().getSimpleName();
    return message == null || message.isBlank() ? kind : message + " (" + kind + ")";
  }

  private static String name(Path jar) {
    return String.valueOf(jar.getFileName());
  }

  private static Finding refusal(String code, Path subject, String sentence) {
    return Finding.of(Severity.WEIGH, code, name(subject), sentence);
  }
}

package earward.host;

import earward.block.BlockType;
import java.io.IOException;
import java.lang.module.ModuleDescriptor;
import java.net.URL;
import java.util.Enumeration;
import java.util.Optional;
import java.util.Set;

/**
 * The parent of every plug-in's loader: shows the JDK without java.desktop, and the packages of
 * block-api. Nothing else of the program, and nothing of another plug-in, can be seen through it.
 */
final class NarrowLoader extends ClassLoader {
  private static final String API = "earward.block";
  private static final String TESTKIT = "earward.block.testkit";
  private static final Set<String> WIDGETS =
      ModuleLayer.boot()
          .findModule("java.desktop")
          .map(Module::getDescriptor)
          .map(ModuleDescriptor::packages)
          .orElse(Set.of());

  private final ClassLoader jdk = ClassLoader.getPlatformClassLoader();
  private final ClassLoader program =
      Optional.ofNullable(BlockType.class.getClassLoader()).orElse(jdk);

  NarrowLoader() {
    super("earward block-api", null);
  }

  @Override
  protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
    int dot = name.lastIndexOf('.');
    String packageName = dot < 0 ? "" : name.substring(0, dot);
    if (WIDGETS.contains(packageName)) {
      throw new ClassNotFoundException(name + " (a plug-in may not use java.desktop)");
    }
    if (isOrWithin(packageName, TESTKIT)) {
      throw new ClassNotFoundException(name);
    }
    return (isOrWithin(packageName, API) ? program : jdk).loadClass(name);
  }

  private static boolean isOrWithin(String packageName, String root) {
    return packageName.equals(root) || packageName.startsWith(root + ".");
  }

  @Override
  public URL getResource(String name) {
    return jdk.getResource(name);
  }

  @Override
  public Enumeration<URL> getResources(String name) throws IOException {
    return jdk.getResources(name);
  }
}

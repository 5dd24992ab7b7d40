package weighhouse.rules;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.JarURLConnection;
import java.net.URI;
import java.net.URL;
import java.net.URLConnection;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;
import java.util.stream.Stream;

/** Rule files as texts, from a folder or from the jar: the folder is the registry. */
final class RuleFolders {
  private static final String ROOT = "rules/";
  private static final String SOURCES = "sources.yaml";
  private static final String ENDING = ".yaml";

  private RuleFolders() {}

  /** A rule file's text with its family (its folder), name and path. */
  record Text(String family, String name, String path, String text) {}

  /** The shipped rules, by path. */
  static List<Text> shipped() {
    try {
      URL sources = RuleFolders.class.getClassLoader().getResource(ROOT + SOURCES);
      if (sources == null) {
        throw new IllegalStateException("the program was built without its rules");
      }
      return sources.openConnection() instanceof JarURLConnection jar
          ? inJar(jar)
          : under(Path.of(URI.create(sources.toString())).getParent());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The shipped list of sources. */
  static String sources() {
    try (InputStream in = RuleFolders.class.getClassLoader().getResourceAsStream(ROOT + SOURCES)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The rules under a folder; families are its sub-folders. */
  static List<Text> under(Path folder) {
    try (Stream<Path> files = Files.walk(folder, 2)) {
      List<Text> texts = new ArrayList<>();
      for (Path file :
          files.filter(f -> isRule(folder.relativize(f).toString())).sorted().toList()) {
        texts.add(text(folder.relativize(file).toString(), Files.readString(file)));
      }
      return texts;
    } catch (IOException e) {
      throw new UncheckedIOException("rules cannot be read from " + folder, e);
    }
  }

  private static List<Text> inJar(URLConnection connection) throws IOException {
    connection.setUseCaches(false);
    List<Text> texts = new ArrayList<>();
    try (JarFile jar = ((JarURLConnection) connection).getJarFile()) {
      List<JarEntry> entries =
          jar.stream()
              .filter(entry -> entry.getName().startsWith(ROOT))
              .filter(entry -> isRule(entry.getName().substring(ROOT.length())))
              .sorted(Comparator.comparing(JarEntry::getName))
              .toList();
      for (JarEntry entry : entries) {
        try (InputStream in = jar.getInputStream(entry)) {
          String content = new String(in.readAllBytes(), StandardCharsets.UTF_8);
          texts.add(text(entry.getName().substring(ROOT.length()), content));
        }
      }
    }
    return texts;
  }

  /** Rules lie one folder down; the lists beside the folders are no rules. */
  private static boolean isRule(String path) {
    return path.replace('\\', '/').matches("[^/]+/[^/]+\\" + ENDING);
  }

  private static Text text(String path, String content) {
    Path parts = Path.of(path);
    String file = parts.getFileName().toString();
    String name = file.substring(0, file.length() - ENDING.length());
    return new Text(parts.getParent().toString(), name, ROOT + path.replace('\\', '/'), content);
  }
}

package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.net.URI;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The relationships of one part: what it refers to, of what type (ECMA-376 part 2, section 9). */
final class Relationships {
  /**
   * A relationship.
   *
   * @param type last step of its type, such as {@code worksheet}, the same in strict files
   * @param target name of a part, or an address outside the package
   */
  record Relationship(String id, String type, String target, boolean external) {}

  private final List<Relationship> all = new ArrayList<>();

  private Relationships() {}

  /** Relationships of the part, none if it has no such list; "" stands for the package itself. */
  static Relationships of(ZipArchive archive, String part) throws IOException {
    Relationships found = new Relationships();
    int slash = part.lastIndexOf('/') + 1;
    String list = part.substring(0, slash) + "_rels/" + part.substring(slash) + ".rels";
    if (archive.has(list)) {
      try (XmlPart xml = XmlPart.open(archive, list)) {
        while (xml.nextElement()) {
          if (xml.element().equals("Relationship")) {
            found.add(xml, part.substring(0, slash));
          }
        }
      }
    }
    return found;
  }

  private void add(XmlPart xml, String folder) {
    String type = xml.attribute("Type", "");
    String target = xml.attribute("Target", "");
    boolean external = xml.attribute("TargetMode", "").equalsIgnoreCase("External");
    all.add(
        new Relationship(
            xml.attribute("Id", ""),
            type.substring(type.lastIndexOf('/') + 1),
            external ? target : resolve(folder, target),
            external));
  }

  /** Name of the part that a target means, seen from a folder. */
  static String resolve(String folder, String target) {
    String path = target.replace('\\', '/');
    try {
      path = URI.create("/" + folder).resolve(path.replace(" ", "%20")).getPath();
    } catch (IllegalArgumentException e) {
      path = path.startsWith("/") ? path : "/" + folder + path;
    }
    return path.startsWith("/") ? path.substring(1) : path;
  }

  Optional<Relationship> byId(String id) {
    return all.stream().filter(r -> r.id().equals(id)).findFirst();
  }

  List<Relationship> ofType(String type) {
    return all.stream().filter(r -> r.type().equals(type)).toList();
  }

  List<Relationship> all() {
    return all;
  }
}

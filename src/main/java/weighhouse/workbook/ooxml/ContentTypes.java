package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** What kind each part of the package is (ECMA-376 part 2, section 10). */
final class ContentTypes {
  private static final String PART = "[Content_Types].xml";

  private final Map<String, String> byExtension = new HashMap<>();
  private final Map<String, String> byPart = new HashMap<>();
  private final List<String> parts = new ArrayList<>();

  private ContentTypes() {}

  static ContentTypes of(ZipArchive archive) throws IOException {
    ContentTypes types = new ContentTypes();
    try (XmlPart xml = XmlPart.open(archive, PART)) {
      while (xml.nextElement()) {
        types.add(xml);
      }
    }
    return types;
  }

  private void add(XmlPart xml) {
    String type = xml.attribute("ContentType", "");
    if (xml.element().equals("Default")) {
      byExtension.put(xml.attribute("Extension", "").toLowerCase(Locale.ROOT), type);
    } else if (xml.element().equals("Override")) {
      String part = xml.attribute("PartName", "");
      parts.add(part.startsWith("/") ? part.substring(1) : part);
      byPart.put(key(part), type);
    }
  }

  /** Content type of the part; empty if none is declared. */
  String of(String part) {
    String type = byPart.get(key(part));
    return type != null ? type : byExtension.getOrDefault(extension(part), "");
  }

  /** Parts declared by name with a type that ends so. */
  List<String> partsOf(String typeEnd) {
    return parts.stream().filter(part -> of(part).endsWith(typeEnd)).toList();
  }

  private static String extension(String part) {
    return part.substring(part.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
  }

  private static String key(String part) {
    return (part.startsWith("/") ? part.substring(1) : part).toLowerCase(Locale.ROOT);
  }
}

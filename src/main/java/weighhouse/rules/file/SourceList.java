package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Published sources by key.
 *
 * @param sources the sources
 * @param faults what is wrong with the list
 */
public record SourceList(Map<String, Entry> sources, List<Fault> faults) {
  private static final Set<String> FIELDS = Set.of("citation", "doi");

  /** A publication; doi may be null. */
  public record Entry(String citation, String doi) {}

  /** Reads the list from YAML. */
  public static SourceList read(String text, String path) {
    Faults faults = new Faults(path);
    Map<String, Entry> sources = new LinkedHashMap<>();
    YamlFile.root(text, faults)
        .map(root -> new Fields(root, faults))
        .ifPresent(
            fields -> {
              for (String key : fields.names()) {
                Fields entry = fields.fields(key);
                entry.only(FIELDS);
                sources.put(key, new Entry(entry.required("citation"), entry.optional("doi")));
              }
            });
    return new SourceList(sources, new ArrayList<>(faults.all()));
  }
}

package weighhouse.generator;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** All cases of a folder, kept in its {@code manifest.json}. */
public record Manifest(long seed, boolean recalculated, List<CaseRecord> cases) {
  /** The file's name. */
  public static final String FILE = "manifest.json";

  private static final ObjectMapper JSON =
      new ObjectMapper().enable(SerializationFeature.INDENT_OUTPUT);

  /** Writes it into a folder. */
  public void write(Path folder) throws IOException {
    JSON.writeValue(folder.resolve(FILE).toFile(), this);
  }

  /** Reads it from a folder. */
  public static Manifest read(Path folder) throws IOException {
    return JSON.readValue(folder.resolve(FILE).toFile(), Manifest.class);
  }
}

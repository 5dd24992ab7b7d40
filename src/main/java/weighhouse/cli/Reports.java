package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.audit.AuditResult;
import weighhouse.report.IndexEntry;
import weighhouse.report.file.WholeFile;
import weighhouse.report.format.Format;
import weighhouse.report.html.IndexPage;
import weighhouse.report.json.IndexJson;

/**
 * Where reports go and in which formats.
 *
 * @param folder made where it does not exist
 * @param formats at least one
 */
record Reports(Path folder, List<Format> formats) {

  /** Writes an audit's reports; gives their file names by format. */
  Map<String, String> write(String name, AuditResult result) throws IOException {
    Map<String, String> files = new LinkedHashMap<>();
    for (Format format : formats) {
      String file = format.fileName(name);
      WholeFile.write(folder.resolve(file), out -> format.writer().write(result, out));
      files.put(format.text(), file);
    }
    return files;
  }

  /** Writes the list of several audits; gives the page, or null where no page was asked for. */
  Path index(List<IndexEntry> entries) throws IOException {
    if (formats.contains(Format.JSON)) {
      WholeFile.write(folder.resolve("index.json"), out -> IndexJson.write(entries, out));
    }
    if (!formats.contains(Format.HTML)) {
      return null;
    }
    Path page = folder.resolve("index.html");
    WholeFile.write(page, out -> IndexPage.write(entries, out));
    return page;
  }
}

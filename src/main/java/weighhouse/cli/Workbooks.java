package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import weighhouse.report.text.Visible;

/** The workbooks that a command was pointed at, each with the name of its reports. */
final class Workbooks {
  private static final List<String> ENDINGS = List.of(".xlsx", ".xlsm", ".xls");

  private Workbooks() {}

  /**
   * Files as given; a folder stands for the workbooks in it and below.
   *
   * @return name of the reports to the file; two files of one name get different report names
   */
  static Map<String, Path> find(List<Path> given) throws IOException, UnusableException {
    List<Path> files = new ArrayList<>();
    for (Path path : given) {
      if (Files.isDirectory(path)) {
        List<Path> inside = inside(path);
        if (inside.isEmpty()) {
          throw new UnusableException(
              "No workbook (.xlsx, .xlsm, .xls) is in " + Visible.text(path.toString()) + ".");
        }
        files.addAll(inside);
      } else {
        files.add(path);
      }
    }
    return named(files);
  }

  private static List<Path> inside(Path folder) throws IOException {
    try (Stream<Path> paths = Files.walk(folder)) {
      return paths.filter(Files::isRegularFile).filter(Workbooks::isWorkbook).sorted().toList();
    }
  }

  private static boolean isWorkbook(Path path) {
    String name = path.getFileName().toString().toLowerCase(Locale.ROOT);
    boolean lockFile = name.startsWith("~$") || name.startsWith(".");
    return !lockFile && ENDINGS.stream().anyMatch(name::endsWith);
  }

  private static Map<String, Path> named(List<Path> files) {
    Map<String, Path> named = new LinkedHashMap<>();
    Map<String, Integer> counts = new HashMap<>();
    for (Path file : files) {
      String name = String.valueOf(file.getFileName());
      int count = counts.merge(name.toLowerCase(Locale.ROOT), 1, Integer::sum);
      named.put(count == 1 ? name : count + "-" + name, file);
    }
    return named;
  }
}

package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import weighhouse.workbook.file.WorkbookReader;

/** Reading seen from outside: what a process of its own prints, and which classes it loads. */
class ReadingProcessTest {
  @TempDir Path folder;

  /** Reads the file named on its command line and says nothing. */
  static final class ReadOne {
    private ReadOne() {}

    public static void main(String[] arguments) throws Exception {
      WorkbookReader.read(Path.of(arguments[0]));
    }
  }

  private String outputOfReading(String fileName, String... options) throws Exception {
    Path file = folder.resolve(fileName);
    Files.write(file, SampleBooks.sample(fileName));
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of(options));
    command.addAll(List.of("-cp", System.getProperty("java.class.path")));
    command.addAll(List.of(ReadOne.class.getName(), file.toString()));
    return run(command);
  }

  private static String run(List<String> command) throws IOException, InterruptedException {
    Process process =
        new ProcessBuilder(command)
            .redirectErrorStream(true)
            .redirectInput(new File(File.separatorChar == '/' ? "/dev/null" : "NUL"))
            .start();
    String output = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertEquals(0, process.waitFor(), output);
    return output;
  }

  @ParameterizedTest
  @MethodSource("weighhouse.workbook.SampleBooks#fileNames")
  void printsNothing(String fileName) throws Exception {
    assertEquals("", outputOfReading(fileName));
  }

  @Test
  void xlsxNeedsNeitherXmlBeansNorTheUserModel() throws Exception {
    String classes = outputOfReading("sample.xlsx", "-verbose:class");
    assertTrue(classes.contains("weighhouse.workbook.ooxml.SheetPart"), "the listing works");
    for (String heavy :
        List.of(
            "org.apache.xmlbeans",
            "org.apache.poi.xssf",
            "org.apache.poi.hssf",
            "org.apache.poi.openxml4j",
            "org.apache.logging",
            "org.apache.commons.compress")) {
      assertTrue(!classes.contains(heavy), heavy + " is loaded");
    }
  }
}

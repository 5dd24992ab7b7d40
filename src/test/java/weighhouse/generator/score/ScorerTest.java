package weighhouse.generator.score;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.generator.CaseRecord;
import weighhouse.generator.Manifest;
import weighhouse.generator.SeededFault;
import weighhouse.generator.SeededFault.CellValue;

/** Matches, misses and false alarms of the scorer, on audits written by hand. */
class ScorerTest {
  private static final SeededFault FAULT =
      new SeededFault(
          "hazard-ratio-times-probability",
          "product",
          List.of("'My sheet'!D5:D20"),
          "=A1*A2",
          "=1-(1-A1)^A2",
          List.of(new CellValue("'My sheet'!D5", 0.25)));

  @TempDir Path folder;

  @Test
  void findsAtTheRootMatchAndOthersAreFalseAlarms() throws IOException {
    audit(
        "a.xlsx",
        finding("hazard-ratio-times-probability", "major", "'My sheet'!D5:D9", 0.25)
            + ","
            + finding("hazard-ratio-times-probability", "minor", "Other!D5", 1)
            + ","
            + finding("ratio-not-used", "query", "Other!D6", 1));
    audit("a-twin.xlsx", finding("ratio-inverted", "major", "Other!A1", 1));
    Score score = score();
    assertEquals(1, score.total().recall());
    assertEquals(1.0 / 3, score.total().precision());
    assertEquals(1, score.total().valuesRight());
    assertEquals(2, score.falseAlarms().size());
  }

  @Test
  void anotherRuleAtTheRootIsAMiss() throws IOException {
    audit("a.xlsx", finding("ratio-inverted", "major", "'My sheet'!D5", 0.3));
    audit("a-twin.xlsx", "");
    Score score = score();
    assertEquals(0, score.total().recall());
    assertEquals(1, score.misses().size());
    assertEquals(1, score.falseAlarms().size());
  }

  private Score score() throws IOException {
    CaseRecord one =
        new CaseRecord(
            "a",
            "model",
            "label-left",
            1,
            false,
            "a.xlsx",
            "a-twin.xlsx",
            List.of(FAULT),
            Map.of(),
            Map.of());
    return Scorer.score(new Manifest(1, true, List.of(one)), folder, it -> true);
  }

  private void audit(String file, String findings) throws IOException {
    Files.writeString(
        folder.resolve(file + ".audit.json"), "{\"findings\":[" + findings + "],\"outcomes\":[]}");
  }

  private static String finding(String rule, String severity, String cells, double correct) {
    return """
        {"rule":"%s","severity":"%s","cells":["%s"],"formula":"=1",
         "values":[{"cell":"'My sheet'!D5","now":1,"correct":%s}]}"""
        .formatted(rule, severity, cells, correct);
  }
}

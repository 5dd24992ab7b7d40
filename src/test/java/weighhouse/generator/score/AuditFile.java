package weighhouse.generator.score;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** What the scorer reads of an audit's JSON. */
record AuditFile(String workbook, List<Finding> findings, Map<String, Double> allCorrected) {
  private static final ObjectMapper JSON = new ObjectMapper();

  /** A finding with the values it holds to be right, by cell. */
  record Finding(
      String rule,
      String severity,
      List<String> cells,
      String formula,
      Map<String, Double> correct) {
    boolean aboveQuery() {
      return !severity.equals("query");
    }
  }

  /** The audit of a workbook, or null where there is none. */
  static AuditFile of(Path folder, String workbook) throws IOException {
    Path file = folder.resolve(workbook + ".audit.json");
    if (!Files.exists(file)) {
      return null;
    }
    JsonNode root = JSON.readTree(file.toFile());
    List<Finding> findings = new ArrayList<>();
    root.path("findings").forEach(node -> findings.add(finding(node)));
    Map<String, Double> corrected = new HashMap<>();
    root.path("outcomes")
        .forEach(node -> number(corrected, node.path("cell").asText(), node.path("allCorrected")));
    return new AuditFile(workbook, findings, corrected);
  }

  private static Finding finding(JsonNode node) {
    List<String> cells = new ArrayList<>();
    node.path("cells").forEach(cell -> cells.add(cell.asText()));
    Map<String, Double> correct = new HashMap<>();
    node.path("values")
        .forEach(value -> number(correct, value.path("cell").asText(), value.path("correct")));
    return new Finding(
        node.path("rule").asText(),
        node.path("severity").asText(),
        cells,
        node.path("formula").asText(),
        correct);
  }

  private static void number(Map<String, Double> into, String cell, JsonNode value) {
    if (value.isNumber()) {
      into.put(cell, value.asDouble());
    }
  }
}

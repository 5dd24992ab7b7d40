package weighhouse.generator;

import java.util.List;
import java.util.Map;

/**
 * What the manifest says of one case.
 *
 * @param kind {@code model} or {@code look-alike}
 * @param keptApart whether the case is for measuring only: nobody tunes on it
 * @param file the workbook, relative to the manifest
 * @param twin its fault-free twin, or null for a look-alike, which is fault-free itself
 * @param faults seeded faults
 * @param outcomes cells of outcomes by name
 * @param expectedOutcomes the twin's values of the outcomes, where it was recalculated
 */
public record CaseRecord(
    String name,
    String kind,
    String layout,
    long seed,
    boolean keptApart,
    String file,
    String twin,
    List<SeededFault> faults,
    Map<String, String> outcomes,
    Map<String, Double> expectedOutcomes) {}

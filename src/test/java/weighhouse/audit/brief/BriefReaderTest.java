package weighhouse.audit.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import weighhouse.audit.Brief;
import weighhouse.audit.Lapsed;
import weighhouse.audit.Severity;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

class BriefReaderTest {
  private static final String FULL =
      """
      workbook: model.xlsx
      cycle: 3 months
      threshold: 20000
      tolerance: 0.01
      outcomes: [ "Results!C10" ]
      quantities:
        Inputs!C5: hazard ratio
        "'Model B'!D5:D9": probability over 6 months
        Inputs!C7: rate per 1000 person-years
        Inputs!D5: hazard ratio, lower limit
      accepted:
        - finding: 3fa1c09b7e
          reason: agreed
          by: J. Rivera
          until: 2027-01-31
      gate:
        hold-at: minor
        least-coverage: 0.95
      """;

  @Test
  void everyFieldIsRead() throws Exception {
    Brief brief = BriefReader.read(FULL);
    assertEquals(0.25, brief.cycleYears(), 1e-12);
    assertEquals(20000, brief.threshold());
    assertEquals(0.01, brief.tolerance());
    assertEquals(List.of("Results!C10"), brief.outcomes());
    assertEquals(Quantity.of(Kind.HAZARD_RATIO), brief.quantities().get("Inputs!C5"));
    assertEquals(
        new Quantity(Kind.PROBABILITY, Role.ESTIMATE, Span.of(6, TimeUnit.MONTH)),
        brief.quantities().get("'Model B'!D5:D9"));
    assertEquals(
        new Quantity(Kind.RATE, Role.ESTIMATE, new Span(1, TimeUnit.YEAR, 1000)),
        brief.quantities().get("Inputs!C7"));
    assertEquals(Role.LOWER_LIMIT, brief.quantities().get("Inputs!D5").role());
    assertEquals(
        new Brief.Accepted("3fa1c09b7e", "agreed", "J. Rivera", LocalDate.of(2027, 1, 31)),
        brief.accepted().get(0));
    assertEquals(new Brief.Demands(Severity.MINOR, 0.95, 0), brief.demands());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "# nothing", "gate:", "quantities: {}"})
  void everythingMayBeLeftOut(String yaml) throws Exception {
    assertEquals(Brief.NONE, BriefReader.read(yaml));
  }

  @Test
  void allFaultsComeAtOnceWithTheirPlaces() {
    String yaml =
        """
        cycle: soon
        treshold: 20000
        outcomes: [ C10 ]
        quantities:
          Inputs!C5: hazard ration
        accepted:
          - finding: 3fa1
            until: 31.1.2027
        gate: { hold-at: grave, least-coverage: 95 }
        """;
    BriefFaultsException e = assertThrows(BriefFaultsException.class, () -> BriefReader.read(yaml));
    assertEquals(
        List.of("1:8", "2:11", "3:13", "5:14", "7:5", "7:5", "8:12", "9:18", "9:41"),
        e.faults().stream().map(fault -> fault.line() + ":" + fault.column()).toList());
    assertEquals(
        "'hazard ration' is no kind of quantity",
        e.faults().get(3).message().substring("quantity of Inputs!C5: ".length()));
  }

  @Test
  void brokenYamlIsAFaultWithItsPlace() {
    BriefFaultsException e =
        assertThrows(
            BriefFaultsException.class, () -> BriefReader.read("cycle: 1 month\n\tgate: x"));
    assertEquals(2, e.faults().get(0).line());
  }

  @Test
  void quantitiesPrintAsTheyAreRead() {
    for (String text :
        List.of(
            "hazard ratio",
            "probability over 6 months",
            "probability over 1 cycle",
            "rate per 1000 person-years",
            "rate per 1 year",
            "log hazard ratio, standard error")) {
      assertEquals(text, QuantityText.print(QuantityText.parse(text)));
    }
  }

  @Test
  void lapsedAcceptancesAreTold() throws Exception {
    Brief brief = BriefReader.read(FULL);
    List<String> there = List.of("3fa1c09b7e");
    assertEquals(List.of(), Lapsed.of(brief, there, LocalDate.of(2027, 1, 31)));
    assertEquals(1, Lapsed.of(brief, there, LocalDate.of(2027, 2, 1)).size());
    assertEquals(1, Lapsed.of(brief, List.of(), LocalDate.of(2026, 1, 1)).size());
  }
}

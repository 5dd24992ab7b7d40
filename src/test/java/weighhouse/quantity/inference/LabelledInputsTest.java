package weighhouse.quantity.inference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Role;
import weighhouse.quantity.TimeUnit;

/** Where real workbooks put their labels. */
class LabelledInputsTest {

  @Test
  void theHeadingOfAColumnSaysWhatASentenceDoesNot() {
    Sheets sheets =
        Sheets.model(
            "Effect | HR (95% CI)",
            "", "", "Drug lowers the risk of progression against care | 0.7");
    assertEquals(Kind.HAZARD_RATIO, sheets.at("B4").kind());
  }

  @Test
  void labelsStandOnTheRight() {
    Sheets sheets =
        Sheets.model(
            "0.7 | Hazard ratio, death",
            "0.1 | Annual probability of death",
            "1200 | | | | | | Cost");
    assertEquals(Kind.HAZARD_RATIO, sheets.at("A1").kind());
    assertEquals(Kind.PROBABILITY, sheets.at("A2").kind());
    assertEquals(Kind.COST, sheets.at("A3").kind());
  }

  @Test
  void namesOnTheLeftHaveDescriptionsSevenColumnsAway() {
    Sheets sheets =
        Sheets.model(
            "name | live | drawn | fixed | SE | distribution | a | b | description",
            "rr_x | 0.8 | 0.79 | 0.8 | 0.1 | log-normal | -0.2 | 0.1 | Rate ratio of relapse");
    assertEquals(Kind.RATE_RATIO, sheets.at("B2").kind());
    assertEquals(Role.DRAW, sheets.at("C2").role());
    assertEquals(Role.STANDARD_ERROR, sheets.at("E2").role());
    assertEquals(Kind.UNKNOWN, sheets.at("G2").kind());
  }

  @Test
  void limitsBelongToTheirEstimate() {
    Sheets sheets =
        Sheets.model(
            "Parameter | Base | Lower | Upper",
            "Hazard ratio | 0.7 | 0.5 | 0.9",
            "",
            "HR, death | 0.8",
            "Lower 95% limit | 0.6");
    assertEquals(Role.LOWER_LIMIT, sheets.at("C2").role());
    assertEquals(Kind.HAZARD_RATIO, sheets.at("C2").kind());
    assertEquals(Role.UPPER_LIMIT, sheets.at("D2").role());
    assertEquals(Kind.HAZARD_RATIO, sheets.at("B5").kind());
    assertEquals(Role.LOWER_LIMIT, sheets.at("B5").role());
  }

  @Test
  void theUnitStandsInTheTitleOfTheSection() {
    Sheets sheets =
        Sheets.model("Mortality rates per 1000 person-years", "Stable | 4", "Progressed | 21");
    assertEquals(Kind.RATE, sheets.at("B2").kind());
    assertEquals(1000, sheets.at("B3").span().people());
    assertEquals(TimeUnit.YEAR, sheets.at("B3").span().unit());
  }

  @Test
  void aHeadingEndsAtTheNextTitle() {
    Sheets sheets =
        Sheets.model(
            "Effect | Hazard ratio", "Drug against care | 0.7", "", "Costs", "Hospital stay | 0.9");
    assertEquals(Kind.COST, sheets.at("B5").kind());
  }

  @Test
  void namesAndCommentsLabelCells() {
    Sheets sheets =
        Sheets.model("0.7", "0.2").name("hr_os", "S!$A$1").comment("A2", "Annual rate of relapse");
    assertEquals(Kind.HAZARD_RATIO, sheets.at("A1").kind());
    assertEquals(Kind.RATE, sheets.at("A2").kind());
  }

  @Test
  void aMergedHeadingStandsOverAllItsColumns() {
    Sheets sheets =
        Sheets.model(" | Hazard ratio", "Event | Base | Low | High", "Death | 0.7 | 0.6 | 0.8")
            .merge("B1", "D1");
    assertEquals(Kind.HAZARD_RATIO, sheets.at("D3").kind());
    assertEquals(Role.UPPER_LIMIT, sheets.at("D3").role());
  }

  @Test
  void matricesOfStatesHoldTransitionProbabilities() {
    Sheets sheets =
        Sheets.model(" | A | B | C", "A | 0.8 | 0.15 | 0.05", "B | 0 | 0.9 | 0.1", "C | 0 | 0 | 1");
    assertEquals(Kind.PROBABILITY, sheets.at("C2").kind());
  }

  @Test
  void namesThatMisleadAreNoMeasures() {
    Sheets sheets =
        Sheets.model(
            "HR department budget | 12",
            "Heart rate | 71",
            "Internal rate of return | 0.08",
            "Interest rate | 0.03",
            "Discount rate | 0.035");
    assertEquals(Kind.UNKNOWN, sheets.at("B1").kind());
    assertEquals(Kind.OTHER_RATE, sheets.at("B2").kind());
    assertEquals(Kind.OTHER_RATE, sheets.at("B3").kind());
    assertEquals(Kind.OTHER_RATE, sheets.at("B4").kind());
    assertEquals(Kind.DISCOUNT_RATE, sheets.at("B5").kind());
  }
}

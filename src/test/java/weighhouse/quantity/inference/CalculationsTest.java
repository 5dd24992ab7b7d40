package weighhouse.quantity.inference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.TimeUnit;
import weighhouse.workbook.CellRange;

/** What formulas say of their cells and of their operands. */
class CalculationsTest {
  private static final String[] INPUTS = {
    "Annual probability of death | 0.2",
    "Annual rate of relapse | 0.3",
    "Hazard ratio | 0.7",
    "Odds ratio | 0.6",
    "Log hazard ratio | -0.36",
    "Relative risk reduction | 0.4",
    "Cycle length (years) | 0.25",
    "Cycles per year | 4",
    "Discount rate | 0.03",
    "Time (years) | 3",
    "Overall survival | 0.8",
    "on/off switch | 1",
  };

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          B1*B3                             | PROBABILITY
          1-(1-B1)^B3                       | PROBABILITY
          1-(1-B1)^(1/12)                   | PROBABILITY
          1-EXP(-B2*B7)                     | PROBABILITY
          1-EXP(-B2/B8)                     | PROBABILITY
          -LN(1-B1)                         | CUMULATIVE_HAZARD
          B2*B3                             | RATE
          B2*B10                            | CUMULATIVE_HAZARD
          EXP(-B2*B10)                      | SURVIVAL
          B11^B3                            | SURVIVAL
          EXP(B5)                           | HAZARD_RATIO
          LN(B3)                            | LOG_HAZARD_RATIO
          1-B6                              | RISK_RATIO
          1-B3                              | HAZARD_REDUCTION
          IF(B12=1,B3,1)                    | HAZARD_RATIO
          MIN(1,ROUND(B1,4))                | PROBABILITY
          IFERROR(CHOOSE(B12,B3,1),1)       | HAZARD_RATIO
          B1/(1-B1)                         | ODDS
          B4*B1/(1-B1+B4*B1)                | PROBABILITY
          B1-B1*(1-B3)                      | PROBABILITY
          1/(1+B9)^B10                      | DISCOUNT_FACTOR
          EXP(-B9*B10)                      | DISCOUNT_FACTOR
          1/B8                              | CYCLE_LENGTH
          INDEX(B1:B4,3)                    | HAZARD_RATIO
          VLOOKUP("Hazard ratio",A1:B9,2,0) | HAZARD_RATIO
          """)
  void algebraGoesUp(String formula, Kind kind) {
    String[] rows = INPUTS.clone();
    rows[0] += " | | =" + formula;
    assertEquals(kind, Sheets.model(rows).at("D1").kind());
  }

  @Test
  void conversionsChangeTheLengthOfTime() {
    String[] rows = INPUTS.clone();
    rows[0] += " | | =1-(1-B1)^(1/12) | =B2/12 | =1-EXP(-B2*B7)";
    Quantities quantities = Sheets.model(rows).infer();
    assertEquals(TimeUnit.MONTH, quantities.at(Sheets.cell(1, "D1")).span().unit());
    assertEquals(TimeUnit.MONTH, quantities.at(Sheets.cell(1, "E1")).span().unit());
    assertEquals(TimeUnit.CYCLE, quantities.at(Sheets.cell(1, "F1")).span().unit());
  }

  @Test
  void usageTellsWhatUnlabelledNumbersAre() {
    Sheets sheets =
        Sheets.model(
            "x | 0.2 | | =1-EXP(-B1*0.5)",
            "y | 0.1 | | =1-(1-B2)^(1/12)",
            "z | 0.03 | | =1/(1+B3)^5");
    assertEquals(Kind.RATE, sheets.at("B1").kind());
    assertEquals(Kind.PROBABILITY, sheets.at("B2").kind());
    assertEquals(Kind.DISCOUNT_RATE, sheets.at("B3").kind());
  }

  @Test
  void aBareRateUsedAsATransitionProbabilityIsOne() {
    String[] rows = {
      "Mortality rate | 0.1",
      "Annual mortality rate | 0.1",
      "",
      "Cycle | Well | Gone",
      "0 | 1 | 0",
      "1 | =B5*(1-$B$1-$B$2) -> 0.8 | =C5+B5*$B$1+B5*$B$2 -> 0.2",
      "2 | =B6*(1-$B$1-$B$2) -> 0.64 | =C6+B6*$B$1+B6*$B$2 -> 0.36",
      "3 | =B7*(1-$B$1-$B$2) -> 0.512 | =C7+B7*$B$1+B7*$B$2 -> 0.488",
    };
    Quantities quantities = Sheets.model(rows).infer();
    assertEquals(Kind.OCCUPANCY, quantities.at(Sheets.cell(1, "B7")).kind());
    assertEquals(Kind.OCCUPANCY, quantities.at(Sheets.cell(1, "C5")).kind());
    assertEquals(Kind.PROBABILITY, quantities.at(Sheets.cell(1, "B1")).kind());
    Inferred annual = quantities.inferred(Sheets.cell(1, "B2"));
    assertEquals(Kind.RATE, annual.quantity().kind());
    assertTrue(annual.contradictions().toString().contains("used as share in state * x in S!"));
  }

  @Test
  void aColumnNameMeansTheCellOfItsRow() {
    Sheets sheets =
        Sheets.model("p | Rest", "0.1 | =1-(1-Prob)^(1/12)", "0.2 | =1-(1-Prob)^(1/12)")
            .name("Prob", "S!$A:$A");
    assertEquals(Kind.PROBABILITY, sheets.at("A2").kind());
    assertEquals(Kind.PROBABILITY, sheets.at("B3").kind());
  }

  @Test
  void aFilledRangeIsCutWhereItsOperandsDiffer() {
    Sheets sheets =
        Sheets.model(
            "Hazard ratio | 0.7 | =B1",
            "Cost of a visit | 80 | =B2",
            "Utility, stable | 0.8 | =B3");
    assertEquals(Kind.HAZARD_RATIO, sheets.at("C1").kind());
    assertEquals(Kind.COST, sheets.at("C2").kind());
    assertEquals(Kind.UTILITY, sheets.at("C3").kind());
  }

  @Test
  void declarationsAreStronger() {
    CellRange cell = CellRange.of(Sheets.cell(1, "B1"));
    Declarations declared =
        new Declarations(Map.of(cell, Quantity.of(Kind.RISK_RATIO)), Double.NaN);
    Quantities quantities = Sheets.model("Hazard ratio | 0.7").infer(declared);
    assertEquals(Kind.RISK_RATIO, quantities.at(Sheets.cell(1, "B1")).kind());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          Cycle length (years) | 0.25          ; 0.25
          Cycle length (months) | 3            ; 0.25
          Cycle length | 1 | month             ; 0.083333333333333333
          Length in years of one cycle | 0.5   ; 0.5
          Cycles per year | 12                 ; 0.083333333333333333
          Cycle length | 1 month               ; 0.083333333333333333
          1 cycle = 1 year                     ; 1
          Model with a monthly cycle           ; 0.083333333333333333
          Ciclos por año | 4                   ; 0.25
          Zykluslänge (Monate) | 1             ; 0.083333333333333333
          Something else | 3                   ; NaN
          """)
  void theCycleLengthIsFound(String row, double years) {
    assertEquals(years, Sheets.model(row).infer().cycle().years(), 1e-9);
  }

  @Test
  void outcomesAndThresholdAreFound() {
    Sheets sheets =
        Sheets.model(
            "Willingness to pay per QALY | 20000",
            " | Care | Drug",
            "Total cost | =100*3 -> 300 | =100*5 -> 500",
            "Total QALYs | =2*0.5 -> 1 | =2.2*0.5 -> 1.1",
            "Incremental cost | =C3-B3 -> 200",
            "Incremental QALYs | =C4-B4 -> 0.1",
            "ICER | =B5/B6 -> 2000");
    Quantities quantities = sheets.infer();
    assertEquals(Sheets.cell(1, "B1"), quantities.threshold().orElseThrow());
    assertEquals(Kind.ICER, quantities.outcomes().get(0).kind());
    assertTrue(
        quantities.outcomes().stream().anyMatch(o -> o.kind() == Kind.QALY && o.incremental()));
    assertTrue(quantities.outcomes().stream().anyMatch(o -> o.cell().equals(Sheets.cell(1, "C3"))));
  }

  @Test
  void otherFieldsAreNoModels() {
    Sheets finance =
        new Sheets()
            .sheet(
                "Loans",
                "Annual probability of default | 0.02",
                "Hazard ratio of the rating | 0.7",
                "Portfolio loan volume | 100",
                "IRR | 0.08",
                "Survival | =EXP(-B1*5)");
    assertFalse(finance.infer().healthEconomic());
    assertEquals(Kind.UNKNOWN, finance.at("B2").kind());
    assertTrue(Sheets.model("Hazard ratio | 0.7").infer().healthEconomic());
  }
}

package weighhouse.quantity.vocabulary;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;

class VocabularyTest {
  private static final Vocabulary WORDS = VocabularyReader.shipped();

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          Hazard ratio                                         | HAZARD_RATIO
          HR (95% CI)                                          | HAZARD_RATIO
          HR to apply                                          | HAZARD_RATIO
          HR new drug vs standard care                         | HAZARD_RATIO
          hr_prog                                              | HAZARD_RATIO
          hrOS                                                 | HAZARD_RATIO
          Reduction in rate of relapse, as hazard ratio        | HAZARD_RATIO
          Relative effect (HR)                                 | HAZARD_RATIO
          IRR of relapse                                       | RATE_RATIO
          RR                                                   | RISK_RATIO
          rr_os                                                | RISK_RATIO
          Relative risk of death                               | RISK_RATIO
          Odds ratio for admission                             | ODDS_RATIO
          Standardised mortality ratio (SMR)                   | MORTALITY_RATIO
          Log hazard ratio                                     | LOG_HAZARD_RATIO
          ln(HR)                                               | LOG_HAZARD_RATIO
          Relative effect                                      | RELATIVE_EFFECT
          Effectiveness                                        | RELATIVE_REDUCTION
          Relative risk reduction                              | RISK_REDUCTION
          Relative reduction in the hazard of death            | HAZARD_REDUCTION
          Operative mortality rate                             | PROBABILITY
          Response rate                                        | PROBABILITY
          Re-revision risk                                     | PROBABILITY
          Death risk                                           | PROBABILITY
          qx                                                   | PROBABILITY
          tp_AB                                                | PROBABILITY
          pDeath                                               | PROBABILITY
          5-year risk of stroke                                | PROBABILITY
          Annual rate                                          | RATE
          Deaths per 1000 population per year                  | RATE
          Events per 100 person-years                          | RATE
          Discount rate                                        | DISCOUNT_RATE
          Interest rate                                        | OTHER_RATE
          Exchange rate                                        | OTHER_RATE
          Heart rate                                           | OTHER_RATE
          HR department budget                                 | UNKNOWN
          Length in years of one cycle                         | CYCLE_LENGTH
          Time step                                            | CYCLE_LENGTH
          Cycles per year                                      | CYCLES_PER_YEAR
          c_drug                                               | COST
          Cost of progression                                  | COST
          u_PFS                                                | UTILITY
          Utility, stable disease                              | UTILITY
          Cost per QALY                                        | ICER
          Willingness to pay per QALY                          | THRESHOLD
          yes or no                                            | UNKNOWN
          Razón de tasas                                       | RATE_RATIO
          Probabilidad de transición                           | PROBABILITY
          Ciclos por año                                       | CYCLES_PER_YEAR
          Modificador                                          | RELATIVE_EFFECT
          Hazardratio                                          | HAZARD_RATIO
          Übergangswahrscheinlichkeit                          | PROBABILITY
          Zykluslänge                                          | CYCLE_LENGTH
          Rapport des risques instantanés                      | HAZARD_RATIO
          Taux d'actualisation                                 | DISCOUNT_RATE
          """)
  void aLabelSaysWhatANumberIs(String label, Kind kind) {
    assertEquals(kind, WORDS.read(label).kind());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          Annual rate                              | 1 YEAR 1
          Probability per month                    | 1 MONTH 1
          Weekly probability                       | 1 WEEK 1
          5-year risk                              | 5 YEAR 1
          Risk over 2 years                        | 2 YEAR 1
          28-day mortality                         | 28 DAY 1
          Events per 100 person-years              | 1 YEAR 100
          Deaths per 1,000 population per year     | 1 YEAR 1000
          Rate per 100k per year                   | 1 YEAR 100000
          Admissions per patient per week          | 1 WEEK 1
          Probability per cycle                    | 1 CYCLE 1
          Tasa anual                               | 1 YEAR 1
          Wahrscheinlichkeit pro Monat             | 1 MONTH 1
          Probabilité par cycle                    | 1 CYCLE 1
          Hazard ratio                             | none
          """)
  void aLabelNamesALengthOfTime(String label, String span) {
    Span read = WORDS.read(label).span();
    assertEquals(
        span,
        read == null
            ? "none"
            : (int) read.amount() + " " + read.unit() + " " + (int) read.people());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          Lower                                | LOWER_LIMIT
          Lower 95% CI                         | LOWER_LIMIT
          LCL                                  | LOWER_LIMIT
          2.5%                                 | LOWER_LIMIT
          hr_os_lower                          | LOWER_LIMIT
          Upper limit                          | UPPER_LIMIT
          hr_hi                                | UPPER_LIMIT
          SE                                   | STANDARD_ERROR
          Standard error of ln(HR)             | STANDARD_ERROR
          drawn                                | DRAW
          Probabilistic                        | DRAW
          Base case                            | ESTIMATE
          Distribution                         | parameter
          alpha                                | parameter
          Lowers the risk compared with Y      | none
          Hazard ratio                         | none
          """)
  void aHeadingNamesAFigureOfAnEstimate(String heading, String figure) {
    Figure read = WORDS.read(heading).figure();
    String said = read == null ? "none" : read.isParameter() ? "parameter" : read.role().name();
    assertEquals(figure, said);
  }

  @Test
  void aHouseAddsItsOwnWords() throws VocabularyException {
    String own = "house:\n  kinds:\n    hazard ratio: { explicit: [effect on hazard] }\n";
    assertEquals(
        Kind.HAZARD_RATIO,
        VocabularyReader.extended("own.yaml", own).read("Effect on hazard").kind());
  }

  @Test
  void everyFaultIsToldWithItsPlace() {
    String own = "house:\n  kinds:\n    hazzard: { explicit: [x] }\n  rolls: [a]\n";
    VocabularyException faults =
        assertThrows(VocabularyException.class, () -> VocabularyReader.extended("own.yaml", own));
    assertEquals(
        "[own.yaml:3:5: no such kind: hazzard, own.yaml:4:3: no such section]",
        faults.faults().toString());
  }
}

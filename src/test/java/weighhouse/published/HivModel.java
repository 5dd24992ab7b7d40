package weighhouse.published;

import weighhouse.generator.book.Book;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;

/**
 * The four-state HIV model of Chancellor et al. 1997 as worked in Briggs, Claxton and Sculpher 2006
 * (chapter 2): zidovudine alone against zidovudine with lamivudine, whose relative risk acts on
 * every exit in the first two years. Transition counts, costs and the relative risk are the book's;
 * their values were recalled and confirmed by reproducing the printed results.
 */
final class HivModel {
  static final String RELATIVE_RISK = "Inputs!B22";
  static final String LIFE_YEARS_MONO = "Results!B3";
  static final String COST_MONO = "Results!C3";
  static final String LIFE_YEARS_COMBINED = "Results!B4";
  static final String COST_COMBINED = "Results!C4";
  static final String ICER = "Results!B6";
  static final int CYCLES = 20;

  private static final String[] STATES = {"State A", "State B", "State C", "Death"};
  private static final double[][] COUNTS = {
    {1251, 350, 116, 17}, {0, 731, 512, 15}, {0, 0, 1312, 437}
  };

  private HivModel() {}

  static Book book() {
    Book book = Book.workbook();
    inputs(book.sheet("Inputs"));
    matrices(book.sheet("Transitions"));
    trace(book.sheet("Monotherapy"), false);
    trace(book.sheet("Combination"), true);
    results(book.sheet("Results"));
    return book;
  }

  private static void inputs(SheetDraft sheet) {
    sheet.label("HIV cohort model, annual cycles").down(2);
    sheet.label("Observed transitions in one year, from row to column").down();
    sheet.label("From").labels(STATES).label("Patients").down();
    for (int from = 0; from < COUNTS.length; from++) {
      sheet.label(STATES[from]).values(COUNTS[from]);
      sheet.formula("SUM(B" + (5 + from) + ":E" + (5 + from) + ")").down();
    }
    sheet.down();
    sheet.label("Annual costs per patient").down();
    sheet.labels("", "Direct medical cost", "Community care cost").down();
    sheet.label(STATES[0]).values(1701, 1055).down();
    sheet.label(STATES[1]).values(1774, 1278).down();
    sheet.label(STATES[2]).values(6948, 2059).down();
    sheet.label("Cost of zidovudine").value(2278).down();
    sheet.label("Cost of lamivudine").value(2086.5).down();
    sheet.down();
    sheet.label("Discount rate, costs").value(0.06).down();
    sheet.label("Discount rate, outcomes").value(0).down();
    sheet.down();
    sheet.label("Treatment effect, applied in years 1 and 2").down();
    sheet.at(20, 0).labels("Parameter", "Mean", "Lower 95% CI", "Upper 95% CI").down();
    sheet.label("Relative risk of disease progression, combination v monotherapy");
    sheet.values(0.509, 0.365, 0.710).down();
  }

  private static void matrices(SheetDraft sheet) {
    sheet.label("Transition probabilities, monotherapy").down();
    sheet.label("From / to").labels(STATES).down();
    for (int from = 0; from < COUNTS.length; from++) {
      sheet.label(STATES[from]);
      for (int to = 0; to < STATES.length; to++) {
        sheet.formula("Inputs!" + CellAt.a1(4 + from, 1 + to) + "/Inputs!$F" + (5 + from));
      }
      sheet.down();
    }
    sheet.down();
    sheet.label("Transition probabilities, combination therapy").down();
    sheet.label("From / to").labels(STATES).down();
    for (int from = 0; from < COUNTS.length; from++) {
      combined(sheet, from);
    }
  }

  private static void combined(SheetDraft sheet, int from) {
    sheet.label(STATES[from]);
    int row = 8 + from;
    for (int to = 0; to < STATES.length; to++) {
      if (to < from) {
        sheet.value(0);
      } else if (to == from) {
        String exits = CellAt.a1(row, 2 + to) + ":" + CellAt.a1(row, 4);
        sheet.formula("1-SUM(" + exits + ")");
      } else {
        sheet.formula(CellAt.a1(2 + from, 1 + to) + "*Inputs!$B$22");
      }
    }
    sheet.down();
  }

  private static void trace(SheetDraft sheet, boolean combination) {
    sheet.label("Markov trace, proportion of the cohort in each state").down();
    sheet
        .label("Cycle (year)")
        .labels(STATES)
        .labels("Life years", "Cost", "Discounted cost")
        .down();
    sheet.value(0).values(1, 0, 0, 0).down();
    for (int cycle = 1; cycle <= CYCLES; cycle++) {
      int row = cycle + 3;
      sheet.value(cycle);
      for (int to = 0; to < STATES.length; to++) {
        sheet.formula(next(to, row - 1, combination && cycle <= 2));
      }
      sheet.formula("SUM(B" + row + ":D" + row + ")");
      sheet.formula(cost(row, combination && cycle <= 2));
      sheet.formula("G" + row + "/(1+Inputs!$B$17)^A" + row).down();
    }
  }

  private static String next(int to, int before, boolean treated) {
    int first = treated ? 9 : 3;
    StringBuilder sum = new StringBuilder();
    for (int from = 0; from <= Math.min(to, 2); from++) {
      sum.append(from == 0 ? "" : "+");
      sum.append(CellAt.a1(before - 1, 1 + from)).append("*Transitions!");
      sum.append(CellAt.fixed(first - 1 + from, 1 + to));
    }
    return to == 3 ? sum + "+E" + before : sum.toString();
  }

  private static String cost(int row, boolean treated) {
    String drugs = treated ? "(Inputs!$B$14+Inputs!$B$15)" : "Inputs!$B$14";
    return "B"
        + row
        + "*SUM(Inputs!$B$11:$C$11)+C"
        + row
        + "*SUM(Inputs!$B$12:$C$12)+D"
        + row
        + "*SUM(Inputs!$B$13:$C$13)+F"
        + row
        + "*"
        + drugs;
  }

  private static void results(SheetDraft sheet) {
    sheet.label("Results").down();
    sheet.labels("", "Life years", "Total cost").down();
    sheet.label("Monotherapy");
    sheet.formula("SUM(Monotherapy!F4:F23)").formula("SUM(Monotherapy!H4:H23)").down();
    sheet.label("Combination therapy");
    sheet.formula("SUM(Combination!F4:F23)").formula("SUM(Combination!H4:H23)").down();
    sheet.label("Incremental").formula("B4-B3").formula("C4-C3").down();
    sheet.label("Incremental cost-effectiveness ratio (cost per life year gained)");
    sheet.formula("C5/B5").down();
  }
}

package weighhouse.published;

import weighhouse.generator.book.Book;
import weighhouse.generator.book.SheetDraft;

/**
 * The total hip replacement model of Briggs, Claxton and Sculpher 2006 (chapter 3) for women of 60:
 * a Weibull revision risk whose ratio for the new prosthesis acts on the hazard. Inputs were
 * recalled and confirmed by reproducing the printed results.
 */
final class HipModel {
  static final String COST_STANDARD = "Results!B3";
  static final String QALY_STANDARD = "Results!C3";
  static final String COST_NEW = "Results!B4";
  static final String QALY_NEW = "Results!C4";
  static final String ICER = "Results!B6";
  static final int CYCLES = 60;

  private HipModel() {}

  static Book book() {
    Book book = Book.workbook();
    inputs(book.sheet("Parameters"));
    trace(book.sheet("Standard"), "Parameters!$B$9", "Parameters!$B$17");
    trace(book.sheet("New prosthesis"), "Parameters!$B$9*Parameters!$B$11", "Parameters!$B$18");
    results(book.sheet("Results"));
    return book;
  }

  private static void inputs(SheetDraft sheet) {
    sheet.label("Total hip replacement, annual cycles").down(2);
    sheet.label("Age at start").value(60).down();
    sheet.label("Survival analysis of revision (Weibull)").down();
    sheet.label("Log of shape, coefficient").value(0.3740968).down();
    sheet.label("Constant, coefficient").value(-5.490935).down();
    sheet.label("Age, coefficient").value(-0.0367022).down();
    sheet.label("New prosthesis, coefficient").value(-1.344474).down();
    sheet.label("lambda").formula("EXP(B6+B7*B3)").down();
    sheet.label("gamma (shape)").formula("EXP(B5)").down();
    sheet.label("Hazard ratio of revision, new prosthesis v standard").formula("EXP(B8)").down();
    sheet.label("Operative mortality rate, primary").value(0.02).down();
    sheet.label("Operative mortality rate, revision").value(0.02).down();
    sheet.label("Re-revision risk").value(0.04).down();
    sheet.down();
    sheet.label("Costs").down();
    sheet.label("Cost of standard prosthesis").value(394).down();
    sheet.label("Cost of new prosthesis").value(579).down();
    sheet.label("Cost of revision operation").value(5294).down();
    sheet.label("Utility, successful primary").value(0.85).down();
    sheet.label("Utility, revision").value(0.3).down();
    sheet.label("Utility, successful revision").value(0.75).down();
    sheet.label("Discount rate, costs").value(0.06).down();
    sheet.label("Discount rate, outcomes").value(0.015).down();
    sheet.at(1, 5).label("Life table, women").down();
    sheet.labels("Age from", "Annual probability of death").down();
    sheet.values(35, 0.00099).down();
    sheet.values(45, 0.0026).down();
    sheet.values(55, 0.0067).down();
    sheet.values(65, 0.0193).down();
    sheet.values(75, 0.0535).down();
    sheet.values(85, 0.1548).down();
  }

  private static void trace(SheetDraft sheet, String lambda, String prosthesis) {
    sheet.label("Markov trace").down();
    sheet.labels("Cycle", "Annual probability of death", "Annual probability of revision");
    sheet.labels("Primary", "Success primary", "Revision", "Success revision", "Dead");
    sheet.labels("Discounted cost", "Discounted QALYs").down();
    sheet.value(0).skip(2).values(1, 0, 0, 0, 0).formula(prosthesis).value(0).down();
    for (int cycle = 1; cycle <= CYCLES; cycle++) {
      row(sheet, cycle, cycle + 3, lambda);
    }
  }

  private static void row(SheetDraft sheet, int cycle, int n, String lambda) {
    int b = n - 1;
    sheet.value(cycle);
    sheet.formula("VLOOKUP(Parameters!$B$3+A" + n + ",Parameters!$F$4:$G$9,2)");
    sheet.formula(
        "1-EXP(" + lambda + "*((A" + n + "-1)^Parameters!$B$10-A" + n + "^Parameters!$B$10))");
    sheet.value(0);
    sheet.formula("D" + b + "*(1-Parameters!$B$12)+E" + b + "*(1-C" + n + "-B" + n + ")");
    sheet.formula("E" + b + "*C" + n + "+G" + b + "*Parameters!$B$14");
    sheet.formula(
        "F" + b + "*(1-Parameters!$B$13-B" + n + ")+G" + b + "*(1-Parameters!$B$14-B" + n + ")");
    sheet.formula("1-SUM(D" + n + ":G" + n + ")");
    sheet.formula("F" + n + "*Parameters!$B$19/(1+Parameters!$B$23)^A" + n);
    sheet
        .formula(
            "(E"
                + n
                + "*Parameters!$B$20+F"
                + n
                + "*Parameters!$B$21+G"
                + n
                + "*Parameters!$B$22)/(1+Parameters!$B$24)^A"
                + n)
        .down();
  }

  private static void results(SheetDraft sheet) {
    sheet.label("Results").down();
    sheet.labels("", "Total cost", "Total QALYs").down();
    sheet.label("Standard prosthesis");
    sheet.formula("SUM(Standard!I3:I63)").formula("SUM(Standard!J3:J63)").down();
    sheet.label("New prosthesis");
    sheet.formula("SUM('New prosthesis'!I3:I63)").formula("SUM('New prosthesis'!J3:J63)").down();
    sheet.label("Incremental").formula("B4-B3").formula("C4-C3").down();
    sheet.label("ICER (cost per QALY gained)").formula("B5/C5").down();
  }
}

package weighhouse.report;

import java.util.List;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Certainty;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.formula.SourceSpan;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Findings for {@link Samples}. */
final class FindingSamples {
  private static final Finding.Source SOURCE =
      new Finding.Source(
          "sonnenberg-beck-1993",
          "Sonnenberg FA, Beck JR. Markov models in medical decision making: a practical guide. Med "
              + "Decis Making 1993;13(4):322-338",
          null,
          "10.1177/0272989X9301300409");

  private FindingSamples() {}

  static List<Finding> three() {
    return List.of(critical(), accepted(), query());
  }

  private static Finding critical() {
    CellAddress host = Samples.at(1, 4, 3);
    return new Finding(
        "3fa1c09b7e",
        rule("hazard-ratio-times-probability", "scale", "A hazard ratio multiplies a probability"),
        Severity.CRITICAL,
        Certainty.PROVEN,
        List.of(new CellRange(1, 4, 3, 483, 3), new CellRange(1, 4, 9, 483, 9)),
        host,
        "=MIN(1,Inputs!$C$8*Inputs!$C$5)+IF($B$2>0,0,1)",
        new SourceSpan(7, 30),
        "=1-(1-Inputs!$C$8)^Inputs!$C$5+IF($B$2>0,0,1)",
        List.of(
            new CellFigures(host, Figure.of(0.21), Figure.of(0.220898)),
            new CellFigures(Samples.at(1, 200, 3), Figure.of(1.02), Figure.of(0.9617)),
            new CellFigures(
                Samples.at(1, 483, 3), Figure.of(0.0000211), new Figure(Double.NaN, "#NUM!"))),
        Samples.outcomes(true),
        true,
        false,
        "The hazard ratio in Inputs!C5 multiplies the probability of progression; the model behaves "
            + "as 0.74 to 0.81 where 0.70 was entered.",
        "A hazard ratio acts on the hazard. Multiplied by a probability it weighs more the larger the "
            + "probability is, and can pass 1.",
        "Was the ratio in Inputs!C5 meant as a ratio of hazards or as a ratio of risks over one month?",
        List.of(
            new Finding.Operand(
                "Inputs!$C$8", "Progression, usual care", "probability, 1 month", Figure.of(0.3)),
            new Finding.Operand("Inputs!$C$5", "HR (95% CI)", "hazard ratio", Figure.of(0.7))),
        List.of(Samples.at(0, 4, 2), host, Samples.at(2, 9, 2)),
        List.of("Assumes that hazards are proportional within the cycle."),
        null);
  }

  private static Finding accepted() {
    CellAddress host = Samples.at(1, 4, 5);
    return new Finding(
        "b2c4417d90",
        rule(
            "probability-divided-by-cycles",
            "cycle",
            "A probability is divided by a number of cycles"),
        Severity.MAJOR,
        Certainty.LIKELY,
        List.of(CellRange.of(host)),
        host,
        "=Inputs!C9/12",
        null,
        "=1-(1-Inputs!C9)^(1/12)",
        List.of(new CellFigures(host, Figure.of(0.01), Figure.of(0.010596))),
        List.of(),
        false,
        false,
        "An annual probability is divided by 12 to make a monthly one.",
        "A probability does not grow in proportion to time; a rate does.",
        "",
        List.of(),
        List.of(),
        List.of(),
        new Finding.Acceptance("agreed with the author on 3 May", "J. Rivera", "2027-01-31"));
  }

  private static Finding query() {
    CellAddress host = Samples.at(0, 6, 2);
    return new Finding(
        "77e0d1aa52",
        rule(
            "interval-not-log-symmetric",
            "uncertainty",
            "An interval is not symmetric about the log of its ratio"),
        Severity.QUERY,
        Certainty.POSSIBLE,
        List.of(CellRange.of(host)),
        host,
        "0.7",
        null,
        null,
        List.of(),
        List.of(),
        false,
        true,
        "The limits 0.55 and 0.89 lie about 0.6996.",
        "Intervals of ratios are symmetric on the log scale.",
        "Which of the three numbers was typed wrongly?",
        List.of(),
        List.of(),
        List.of(),
        null);
  }

  static Finding hostile(String text) {
    CellAddress host = Samples.at(1, 4, 3);
    return new Finding(
        "<b>\"x'" + text,
        new Finding.RuleText(
            text, text, text, List.of(new Finding.Source(text, text, text, "javascript:" + text))),
        Severity.CRITICAL,
        Certainty.LIKELY,
        List.of(CellRange.of(host)),
        host,
        "=" + text,
        new SourceSpan(2, 900),
        "=" + text,
        List.of(new CellFigures(host, new Figure(Double.NaN, text), Figure.of(1))),
        List.of(),
        false,
        false,
        text,
        text,
        text,
        List.of(new Finding.Operand(text, text, text, Figure.of(1))),
        List.of(host),
        List.of(text),
        new Finding.Acceptance(text, text, text));
  }

  static Finding at(CellRange cells, String suggested) {
    return new Finding(
        "0123456789",
        rule("hazard-ratio-times-probability", "scale", "A hazard ratio multiplies a probability"),
        Severity.MAJOR,
        Certainty.PROVEN,
        List.of(cells),
        cells.first(),
        "=A2*$A$1",
        null,
        suggested,
        List.of(),
        List.of(),
        false,
        false,
        "A hazard ratio multiplies a probability.",
        "It acts on the hazard.",
        "",
        List.of(),
        List.of(),
        List.of(),
        null);
  }

  static Finding copy(Finding f, String id) {
    return new Finding(
        id,
        f.rule(),
        f.severity(),
        f.certainty(),
        f.cells(),
        f.host(),
        f.formula(),
        f.offending(),
        f.suggestedFormula(),
        f.values(),
        f.outcomes(),
        f.decisionFlips(),
        f.silent(),
        f.message(),
        f.explanation(),
        f.question(),
        f.operands(),
        f.path(),
        f.notes(),
        f.acceptance());
  }

  private static Finding.RuleText rule(String id, String family, String title) {
    return new Finding.RuleText(id, family, title, List.of(SOURCE));
  }
}

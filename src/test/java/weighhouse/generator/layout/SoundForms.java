package weighhouse.generator.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Dice;

/** Side calculations that are right although they look like faults: a few in each workbook. */
final class SoundForms implements Placement {
  private static final List<List<String>> FORMS =
      List.of(
          List.of("Annuity factor, 10 years", "(1/{disc})*(1-EXP(-{disc}*10))"),
          List.of("Continuous discount factor, year 5", "EXP(-{disc}*5)"),
          List.of("Interest per month", "{disc}/12"),
          List.of(
              "Registry dropout per month (churn)", "#0.02", "Left after 2 months", "(1-{:1})^2"),
          List.of(
              "Annual probability of influenza", "#0.08",
              "Vaccine coverage", "#0.6",
              "Vaccine efficacy (relative risk reduction)", "#0.45",
              "Annual probability of influenza, vaccinated population", "{:1}*(1-{:2}*{:3})"),
          List.of(
              "Low value, minus 20%",
              "0.8*{p}", "High value", "{p}*1.2", "Low value, alternative", "{p}/1.2"),
          List.of(
              "Share of events treated as inpatient",
              "#0.35",
              "Inpatient events per patient and cycle",
              "{:1}*{p}"),
          List.of("Expected events in 1,000 patients per cycle", "1000*{p}"),
          List.of(
              "Age coefficient (cost regression)",
              "#42",
              "Cost increase over 10 years of age",
              "{:1}*10"),
          List.of(
              "Cost ratio, private vs public provider",
              "#1.3",
              "Cost of an event, private",
              "{p}*{:1}*2400"),
          List.of(
              "Probability of a test", "#0.4",
              "Probability of a positive result", "#0.15",
              "Tested and negative", "{:1}*(1-{:2})"),
          List.of(
              "Prevalence",
              "#0.12",
              "Prevalence ratio, urban vs rural",
              "#1.2",
              "Prevalence, urban",
              "{:1}*{:2}"),
          List.of("Utility multiplier for age", "#0.96", "Adjusted utility", "{util.0}*{:1}"));

  @Override
  public void place(ModelDraft draft) {
    if (!draft.words().language().equals("en")) {
      return;
    }
    Dice dice = draft.dice();
    SheetDraft sheet = draft.book().sheet("Other").at(0, 0).label("Side calculations").down(2);
    for (List<String> form : some(dice)) {
      write(draft, sheet, form);
      sheet.down();
    }
  }

  private static List<List<String>> some(Dice dice) {
    List<List<String>> left = new ArrayList<>(FORMS);
    return Stream.generate(() -> left.remove(dice.between(0, left.size() - 1)))
        .limit(dice.between(3, 6))
        .toList();
  }

  private static void write(ModelDraft draft, SheetDraft sheet, List<String> form) {
    for (int i = 0; i < form.size(); i += 2) {
      sheet.label(form.get(i));
      String text = form.get(i + 1);
      if (text.startsWith("#")) {
        sheet.value(Double.parseDouble(text.substring(1)));
      } else {
        sheet.formula(text.replace("{p}", probability(draft)).replace("{:", "{other."));
      }
      sheet.as("other." + (i / 2 + 1)).down();
    }
  }

  private static String probability(ModelDraft draft) {
    return draft.model().scalars().stream()
        .findFirst()
        .map(event -> "{" + event.result(0) + "}")
        .orElse("0.04");
  }
}

package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.workbook.CellAddress;

/** The level of confidence of an interval as its labels tell it. */
public final class IntervalLevel {
  private static final Pattern PERCENT =
      Pattern.compile("(?<![0-9.,])(2\\.5|5|10|80|90|95|97\\.5|98|99)\\s?(?:%|per ?cent|th\\b)");

  private final NearbyTexts texts;

  public IntervalLevel(NearbyTexts texts) {
    this.texts = texts;
  }

  /** A level such as 0.95; empty where the labels tell none or several. */
  public Optional<Double> of(List<CellAddress> limits) {
    List<String> words = new ArrayList<>();
    limits.forEach(limit -> words.addAll(texts.of(limit)));
    Set<String> told = new TreeSet<>();
    for (String text : words) {
      Matcher matcher = PERCENT.matcher(text);
      while (matcher.find()) {
        told.add(matcher.group(1));
      }
    }
    return level(told);
  }

  private static Optional<Double> level(Set<String> told) {
    if (told.contains("2.5") || told.contains("97.5")) {
      return Optional.of(0.95);
    } else if (told.contains("5") || told.contains("10")) {
      return percentiles(told);
    }
    return told.size() == 1
        ? Optional.of(Double.parseDouble(told.iterator().next()) / 100)
        : Optional.empty();
  }

  /** The 5th and 95th percentiles bound an interval of 90 %. */
  private static Optional<Double> percentiles(Set<String> told) {
    boolean five = told.equals(Set.of("5", "95"));
    boolean ten = told.equals(Set.of("10", "90"));
    return five ? Optional.of(0.90) : ten ? Optional.of(0.80) : Optional.empty();
  }
}

package weighhouse.quantity.label;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.vocabulary.Figure;
import weighhouse.quantity.vocabulary.Sense;
import weighhouse.quantity.vocabulary.Strength;
import weighhouse.workbook.CellAddress;

/** Weighs the texts near a number against each other. */
public final class Labels {
  private static final int STEP = 10;

  /** Effect measures are told by the heading of their column as well as by the row's label. */
  private static final int MEASURE = 3;

  private static final Set<Kind> MEASURES = EnumSet.range(Kind.HAZARD_RATIO, Kind.LOG_ODDS_RATIO);

  /** A row of these is no effect measure, whatever the heading of its column says. */
  private static final Set<Kind> THINGS =
      EnumSet.of(
          Kind.COST,
          Kind.UTILITY,
          Kind.LIFE_YEARS,
          Kind.QALY,
          Kind.ICER,
          Kind.NET_BENEFIT,
          Kind.THRESHOLD,
          Kind.DISCOUNT_RATE,
          Kind.AGE);

  private static final Set<Kind> BETWEEN_0_AND_1 =
      EnumSet.of(Kind.PROBABILITY, Kind.SURVIVAL, Kind.PROPORTION, Kind.OCCUPANCY);

  private final Headings headings;

  public Labels(Headings headings) {
    this.headings = headings;
  }

  private record Candidate(Label label, Kind kind, Strength strength, int score) {}

  /**
   * What the texts near a cell make of its number.
   *
   * @param number typed in the cell; NaN where it is calculated
   */
  public Guess guess(CellAddress cell, double number) {
    return weigh(headings.near(cell), number);
  }

  private static Guess weigh(List<Label> labels, double number) {
    Candidate best = null;
    boolean parameter = false;
    boolean thing = isThing(labels);
    boolean described = isDescribed(labels);
    for (Label label : labels) {
      parameter |= isParameter(label, labels);
      if (described && isCode(label)) {
        continue;
      }
      int bonus = thing && label.place() == Place.ABOVE ? 0 : MEASURE;
      for (Sense sense : label.reading().senses()) {
        Candidate candidate = candidate(label, sense, number, bonus);
        if (candidate != null && (best == null || candidate.score() > best.score())) {
          best = candidate;
        }
      }
    }
    Kind kind = best == null || parameter ? Kind.UNKNOWN : best.kind();
    Quantity quantity = new Quantity(kind, role(labels), span(labels, best));
    if (kind == Kind.UNKNOWN) {
      return new Guess(quantity, Strength.WEAK, parameter, List.of());
    }
    return new Guess(quantity, best.strength(), false, evidence(best, labels));
  }

  /** Whether words on the right say what a code on the left only abbreviates. */
  private static boolean isDescribed(List<Label> labels) {
    return labels.stream()
        .filter(label -> label.place() == Place.RIGHT || label.place() == Place.DESCRIPTION)
        .anyMatch(label -> !isCode(label) && !label.reading().senses().isEmpty());
  }

  /** A text like {@code p2_base}, beside the number. */
  private static boolean isCode(Label label) {
    String text = label.text().strip();
    return label.place() == Place.LEFT && text.indexOf(' ') < 0 && text.indexOf('_') > 0;
  }

  /** Whether the row's own label names a thing of the model that is no risk. */
  private static boolean isThing(List<Label> labels) {
    return labels.stream()
        .filter(label -> label.place() == Place.LEFT || label.place() == Place.RIGHT)
        .flatMap(label -> label.reading().senses().stream())
        .anyMatch(sense -> THINGS.contains(sense.kind()));
  }

  private static Candidate candidate(Label label, Sense sense, double number, int measureBonus) {
    int level = sense.strength().level() - label.place().discount();
    if (level < 0 || !fits(sense, number)) {
      return null;
    }
    boolean near = label.place().remoteness() <= Place.DESCRIPTION.remoteness();
    int bonus = near && MEASURES.contains(sense.kind()) ? measureBonus : 0;
    int score = level * STEP + bonus - label.place().remoteness();
    return new Candidate(label, sense.kind(), Strength.ofLevel(level), score);
  }

  /** The number's range, only ever against words that leave a doubt. */
  private static boolean fits(Sense sense, double number) {
    if (Double.isNaN(number) || sense.strength() == Strength.EXPLICIT) {
      return true;
    }
    if (BETWEEN_0_AND_1.contains(sense.kind())) {
      return number >= 0 && number <= 1;
    }
    return !MEASURES.contains(sense.kind()) || sense.strength() != Strength.WEAK || number > 0;
  }

  /** A column of distribution parameters, whatever the rows are. */
  private static boolean isParameter(Label label, List<Label> labels) {
    Figure figure = label.reading().figure();
    return figure != null
        && figure.isParameter()
        && (label.place() == Place.ABOVE || label.place() == Place.FAR_HEADING)
        && labels.stream().anyMatch(l -> l.place() == Place.LEFT || l.place() == Place.NAME);
  }

  private static Role role(List<Label> labels) {
    for (Label label : labels) {
      Figure figure = label.reading().figure();
      boolean near =
          label.place().remoteness() <= Place.ABOVE.remoteness()
              || label.place() == Place.FAR_HEADING;
      if (near && figure != null && !figure.isParameter() && figure.role() != Role.ESTIMATE) {
        return figure.role();
      }
    }
    return Role.ESTIMATE;
  }

  /** The span that the deciding text tells, else the nearest text that tells one. */
  private static Span span(List<Label> labels, Candidate best) {
    if (best != null && best.label().reading().span() != null) {
      return best.label().reading().span();
    }
    return labels.stream()
        .filter(label -> label.reading().span() != null)
        .filter(l -> l.place() != Place.SHEET && l.place() != Place.FAR_HEADING)
        .map(label -> label.reading().span())
        .findFirst()
        .orElse(null);
  }

  private static List<Label> evidence(Candidate best, List<Label> labels) {
    List<Label> evidence = new ArrayList<>();
    evidence.add(best.label());
    for (Label label : labels) {
      boolean agrees = label.reading().kind() == best.kind() && label.place() != Place.SHEET;
      if (agrees && !evidence.contains(label) && evidence.size() < 3) {
        evidence.add(label);
      }
    }
    return evidence;
  }

  /** A short label for people; may be empty. */
  public String forPeople(CellAddress cell) {
    List<Label> labels = headings.near(cell);
    String row = text(labels, Place.LEFT);
    row = row.isEmpty() ? text(labels, Place.RIGHT) : row;
    String column = text(labels, Place.ABOVE);
    if (row.isEmpty()) {
      return column.isEmpty() ? text(labels, Place.NAME) : column;
    }
    return column.isEmpty() || isGeneric(labels) ? row : row + ", " + column;
  }

  /** Whether the column's heading says no more than "value". */
  private static boolean isGeneric(List<Label> labels) {
    return labels.stream()
        .filter(label -> label.place() == Place.ABOVE)
        .findFirst()
        .map(label -> label.reading())
        .filter(
            r -> r.senses().isEmpty() && r.figure() != null && r.figure().role() == Role.ESTIMATE)
        .isPresent();
  }

  private static String text(List<Label> labels, Place place) {
    return labels.stream()
        .filter(label -> label.place() == place)
        .map(label -> label.text().strip())
        .findFirst()
        .orElse("");
  }
}

package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.rules.term.Identity;
import weighhouse.rules.term.Sample;
import weighhouse.rules.term.Term;

/**
 * A formula and a pattern evaluated at the same values of the metavariables, with all else in the
 * formula held at two different backgrounds.
 */
final class Points {
  private static final int BACKGROUNDS = 2;
  private static final int SETTINGS = 4;

  private final Map<String, Bound> bounds;
  private final List<Map<String, Double>> settings = new ArrayList<>();
  private final Sample[][] samples = new Sample[BACKGROUNDS][SETTINGS];

  Points(Map<String, Bound> bounds, int terms) {
    this.bounds = bounds;
    for (int setting = 0; setting < SETTINGS; setting++) {
      Map<String, Double> values = new HashMap<>();
      int index = 0;
      for (String name : bounds.keySet()) {
        values.put(name, spread(index++, setting));
      }
      settings.add(values);
      for (int background = 0; background < BACKGROUNDS; background++) {
        samples[background][setting] = sample(background, values, terms);
      }
    }
  }

  /** Numbers in (0.15, 0.85) without simple relations among them. */
  private static double spread(int index, int setting) {
    double turns = (index + 1) * 0.61803398875 + (setting + 1) * 0.75487766625;
    return 0.15 + 0.7 * (turns - Math.floor(turns));
  }

  private Sample sample(int background, Map<String, Double> values, int terms) {
    Sample sample = new Sample(background + 1, terms);
    bounds.forEach(
        (name, bound) -> sample.with(bound.term(), bound.wrapping().term(values.get(name))));
    return sample;
  }

  double[] pattern(Pattern pattern) {
    return settings.stream().mapToDouble(pattern::value).toArray();
  }

  /** Whether the term holds the pattern's function and the operands in no other way. */
  boolean holds(Term term, double[] pattern) {
    for (int background = 0; background < BACKGROUNDS; background++) {
      if (!Identity.affine(pattern, values(background, term))) {
        return false;
      }
    }
    return true;
  }

  /** Whether the term, less some others, is the pattern's function times some factors. */
  boolean equal(Term term, List<Term> less, List<Term> times, double[] pattern) {
    for (int background = 0; background < BACKGROUNDS; background++) {
      for (int setting = 0; setting < SETTINGS; setting++) {
        Sample sample = samples[background][setting];
        double rest = sample.of(term) - less.stream().mapToDouble(sample::of).sum();
        double product = pattern[setting];
        for (Term factor : times) {
          product *= sample.of(factor);
        }
        if (!Identity.agree(rest, product)) {
          return false;
        }
      }
    }
    return true;
  }

  private double[] values(int background, Term term) {
    double[] values = new double[SETTINGS];
    for (int setting = 0; setting < SETTINGS; setting++) {
      values[setting] = samples[background][setting].of(term);
    }
    return values;
  }
}

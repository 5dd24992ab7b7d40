package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import weighhouse.audit.ActsOn;
import weighhouse.audit.Measure;
import weighhouse.formula.Region;
import weighhouse.quantity.Kind;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Probes every measure of the ledger and reads the answers. */
public final class Observer {
  /** Points of the effective ratio along the cycles; more than a plot can show. */
  private static final int SERIES = 240;

  private static final int REACHES = 60;

  private final Subject subject;

  public Observer(Subject subject) {
    this.subject = subject;
  }

  /** What is seen of each entry, in the ledger's order. */
  public List<Observation> observe(List<Ledger.Entry> entries) {
    return entries.parallelStream().map(this::observe).toList();
  }

  private Observation observe(Ledger.Entry entry) {
    Reach reach = new Reach(subject, entry.cell());
    List<Region> risks = reach.regions(kind -> Probe.asProbability(kind) != null);
    Probe.Runs runs = new Probe(subject).run(entry);
    List<Region> moving = moving(risks, runs);
    if (moving.isEmpty()) {
      runs = new SwitchSearch(subject).runsThatMove(entry, risks).orElse(runs);
      moving = moving(risks, runs);
    }
    List<Region> transitions =
        moving.stream().filter(region -> Probe.TRANSITIONS.contains(kind(region))).toList();
    List<Region> told = transitions.isEmpty() ? moving : reach.entries(transitions);
    List<Observation.Entering> seen = entering(reach.entries(moving), runs);
    return new Observation(
        entry,
        scale(seen),
        exponent(seen),
        effective(entry, told, runs),
        series(entry, told, runs),
        transitions.stream().map(Region::range).limit(REACHES).toList(),
        seen);
  }

  private List<Region> moving(List<Region> regions, Probe.Runs runs) {
    return regions.stream()
        .filter(
            region -> CellsOf.spread(region.range(), Reach.SAMPLE).stream().anyMatch(runs::moves))
        .toList();
  }

  private List<Observation.Entering> entering(List<Region> regions, Probe.Runs runs) {
    List<Observation.Entering> seen = new ArrayList<>();
    for (Region region : regions) {
      DoubleUnaryOperator view = Probe.asProbability(kind(region));
      Response.Reading reading = null;
      for (CellAddress cell : CellsOf.spread(region.range(), Reach.SAMPLE)) {
        Response response = runs.response(cell, view);
        if (response.moves()) {
          Response.Reading here = response.read();
          reading =
              reading == null || agree(reading, here)
                  ? here
                  : new Response.Reading(ActsOn.MIXED, Double.NaN);
        }
      }
      if (reading != null) {
        seen.add(new Observation.Entering(region, reading.scale(), reading.exponent()));
      }
    }
    return seen;
  }

  private static boolean agree(Response.Reading a, Response.Reading b) {
    return a.scale() == b.scale() && Math.abs(a.exponent() - b.exponent()) < 1e-5;
  }

  private static ActsOn scale(List<Observation.Entering> seen) {
    List<ActsOn> scales = seen.stream().map(Observation.Entering::actsOn).distinct().toList();
    return scales.isEmpty() ? ActsOn.NOTHING : scales.size() == 1 ? scales.get(0) : ActsOn.MIXED;
  }

  private static double exponent(List<Observation.Entering> seen) {
    double[] exponents =
        seen.stream().mapToDouble(Observation.Entering::exponent).distinct().toArray();
    return exponents.length == 1 ? exponents[0] : Double.NaN;
  }

  private Measure.Effective effective(Ledger.Entry entry, List<Region> regions, Probe.Runs runs) {
    List<Double> ratios = new ArrayList<>();
    for (Region region : regions) {
      ratios.addAll(ratios(entry, region, runs, SERIES));
    }
    Collections.sort(ratios);
    return ratios.isEmpty()
        ? null
        : new Measure.Effective(
            ratios.get(0), ratios.get(ratios.size() / 2), ratios.get(ratios.size() - 1));
  }

  private List<Double> series(Ledger.Entry entry, List<Region> regions, Probe.Runs runs) {
    return regions.stream()
        .map(region -> ratios(entry, region, runs, SERIES))
        .filter(ratios -> ratios.size() > 1)
        .findFirst()
        .orElse(List.of());
  }

  /** The ratios delivered over a region on the measure's own scale, cell by cell. */
  private List<Double> ratios(Ledger.Entry entry, Region region, Probe.Runs runs, int most) {
    RatioLaw law = RatioLaw.of(entry.kind()).orElseThrow();
    Scale scale = scaleOf(law.estimatedOn());
    DoubleUnaryOperator view = Probe.asProbability(kind(region));
    List<Double> ratios = new ArrayList<>();
    for (CellAddress cell : CellsOf.spread(region.range(), most)) {
      Response response = runs.response(cell, view);
      double ratio = scale.ratio(response.probabilities().get(0), response.neutral());
      if (response.moves() && Double.isFinite(ratio)) {
        ratios.add(ratio);
      }
    }
    return ratios;
  }

  private static Scale scaleOf(ActsOn estimatedOn) {
    return switch (estimatedOn) {
      case RISK -> Scale.RISK;
      case ODDS -> Scale.ODDS;
      default -> Scale.HAZARD;
    };
  }

  private Kind kind(Region region) {
    CellRange range = region.range();
    return subject.quantities().at(range.first()).kind();
  }
}

package dayworth.casefile;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Case;
import dayworth.decision.TimeUnit;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Reads a case folder: a sound case, or every problem in it. */
public final class CaseReader {

  private final Findings findings = new Findings();
  private final CaseFolder folder;
  private final String name;

  private CaseReader(Path path) {
    Path absolute = path.toAbsolutePath().normalize();
    name = String.valueOf(absolute.getFileName());
    folder = new CaseFolder(absolute, findings);
  }

  /**
   * Reads a folder.
   *
   * @param atLeast the time scale is at least as fine as this
   */
  public static Reading read(Path path, TimeScale atLeast) {
    return new CaseReader(path).read(atLeast);
  }

  private Reading read(TimeScale atLeast) {
    folder.checkNames();
    Optional<String> activityText = folder.text(ActivityTable.FILE);
    Optional<String> linkText = folder.text(LinkTable.FILE);
    Optional<String> termText = folder.text(TermsTable.FILE);
    Optional<List<ActivityRow>> known =
        activityText.flatMap(text -> ActivityTable.read(text, findings));
    List<LinkRow> links = LinkTable.read(known, linkText, findings);
    TermsTable terms = TermsTable.read(termText, findings);
    if (findings.hasProblems()) {
      return new Reading.Unsound(findings.problems(), findings.warnings());
    }
    Case read = build(known.orElseThrow(), links, terms, atLeast);
    if (findings.hasProblems()) {
      return new Reading.Unsound(findings.problems(), findings.warnings());
    }
    return new Reading.Sound(read);
  }

  private Case build(
      List<ActivityRow> activities, List<LinkRow> links, TermsTable terms, TimeScale atLeast) {
    TimeScale scale = scale(activities, links, terms).and(atLeast);
    Network network =
        new Network(
            scale,
            activities.stream().map(row -> activity(row, scale)).toList(),
            links.stream().map(row -> link(row, scale)).toList());
    if (Stepping.scaleFor(network).isEmpty()) {
      findings.problem(
          Place.whole(ActivityTable.FILE)
              .notice("the costs are too far apart to be exact", "", "smaller or rounder costs"));
    }
    Doubts.report(new ReadCase(network, activities, links, terms), findings);
    return new Case(
        name,
        terms.text("title").orElse(""),
        terms.text("currency").orElse(""),
        TimeUnit.valueOf(terms.text("time_unit").orElse("DAY")),
        network,
        contract(terms, scale),
        findings.warnings(),
        folder.inputs());
  }

  private static TimeScale scale(
      List<ActivityRow> activities, List<LinkRow> links, TermsTable terms) {
    TimeScale scale = TimeScale.WHOLE;
    for (ActivityRow row : activities) {
      scale = scale.and(of(row.normal())).and(of(row.crash())).and(of(row.notBefore()));
    }
    for (LinkRow row : links) {
      scale = scale.and(TimeScale.of(row.lag()));
    }
    for (String term : List.of("contract_finish", "damages_grace", "bonus_cap_units")) {
      scale = scale.and(of(terms.number(term)));
    }
    return bendsAreWhole(terms) ? scale : new TimeScale(TimeScale.MOST_DECIMALS);
  }

  private static TimeScale of(Optional<BigDecimal> units) {
    return units.map(TimeScale::of).orElse(TimeScale.WHOLE);
  }

  /** Whether the caps in money are reached at whole units; otherwise the finest scale is used. */
  private static boolean bendsAreWhole(TermsTable terms) {
    return isWhole(terms, "damages_cap", "damages_rate")
        && isWhole(terms, "bonus_cap", "bonus_rate");
  }

  private static boolean isWhole(TermsTable terms, String cap, String rate) {
    BigDecimal per = terms.amount(rate);
    return per.signum() == 0 || terms.amount(cap).remainder(per).signum() == 0;
  }

  private static Activity activity(ActivityRow row, TimeScale scale) {
    BigDecimal normal = row.normal().orElseThrow();
    Money cost = Money.of(row.normalCost().orElseThrow());
    return new Activity(
        row.id(),
        row.name(),
        row.group(),
        scale.ticks(normal),
        scale.ticks(row.crash().orElse(normal)),
        cost,
        row.crashCost().map(Money::of).orElse(cost),
        scale.ticks(row.notBefore().orElse(BigDecimal.ZERO)));
  }

  private static Link link(LinkRow row, TimeScale scale) {
    return new Link(row.predecessor(), row.successor(), row.relation(), scale.ticks(row.lag()));
  }

  private static Terms contract(TermsTable terms, TimeScale scale) {
    return new Terms(
        scale,
        Optional.empty(),
        new TimeRelated(Money.of(terms.amount("time_related_cost")), Per.UNIT),
        Money.of(terms.amount("fixed_cost")),
        terms.number("contract_finish").map(scale::ticks).map(Due::at),
        Damages.perUnit(
            Money.of(terms.amount("damages_rate")),
            terms.amount("damages_grace"),
            terms.number("damages_cap").map(Money::of)),
        new Bonus(
            Money.of(terms.amount("bonus_rate")),
            Per.UNIT,
            terms.number("bonus_cap").map(Money::of),
            terms.number("bonus_cap_units")));
  }
}

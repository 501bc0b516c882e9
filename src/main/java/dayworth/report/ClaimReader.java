package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.ClaimRefuted;
import dayworth.decision.ClaimedCurve;
import dayworth.decision.ClaimedCurve.ClaimedStep;
import dayworth.decision.CrossCheck;
import dayworth.decision.Unproved;
import dayworth.decision.Wish;
import dayworth.engine.Change;
import dayworth.engine.Flow;
import dayworth.engine.Obstacle;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;

/** Reads from a result what all else in it follows from. */
final class ClaimReader {

  private final Case of;
  private final Network network;
  private final TimeScale scale;
  private final JsonPlace result;

  ClaimReader(Case of, JsonPlace result) {
    this.of = of;
    this.network = of.network();
    this.scale = network.scale();
    this.result = result;
  }

  ClaimedCurve curve() throws ClaimRefuted {
    JsonPlace evidence = result.get("evidence");
    List<JsonPlace> rows = result.get("curve").items();
    if (rows.isEmpty()) {
      throw result.get("curve").wrong("at least one finish");
    }
    SortedMap<Long, Plan> plans = new TreeMap<>();
    for (JsonPlace plan : evidence.get("plans").items()) {
      if (plans.put(ticks(plan, "duration"), plan(plan)) != null) {
        throw plan.get("duration").wrong("one plan for each finish");
      }
    }
    return new ClaimedCurve(
        ticks(rows.get(0), "duration"),
        rows.size(),
        each(result.get("steps"), this::step),
        each(evidence.get("breakpoint_plans"), this::plan),
        each(result.get("shortest").get("stopped_by"), this::obstacle),
        slopeUnits(evidence.get("slope_units")),
        evidence.get("flows").isNothing()
            ? Optional.empty()
            : Optional.of(each(evidence.get("flows"), this::flow)),
        plans,
        plan(evidence.get("as_planned")),
        plan(evidence.get("crash_everything")),
        ticks(result.get("plan"), "duration"),
        each(result.get("proof").get("unproved"), this::unproved),
        result.get("proof").get("cut_by_effort").isYes(),
        crossCheck(result.get("crosscheck")));
  }

  Wish wish() throws ClaimRefuted {
    JsonPlace asked = result.get("asked");
    Optional<JsonPlace> by = asked.find("by");
    if (by.isPresent()) {
      LocalDate date = date(by.get());
      return Wish.ByDate.of(
          date, of.terms().calendar().orElseThrow(() -> asked.wrong("a case with dates")));
    }
    Optional<JsonPlace> in = asked.find("in");
    if (in.isPresent()) {
      return new Wish.In(in.get().ticks(scale));
    }
    Money most = money(asked.get("within"));
    if (most.signum() < 0) {
      throw asked.get("within").wrong("at least 0");
    }
    return new Wish.Within(most);
  }

  List<Flow.Entry> proofFlow() throws ClaimRefuted {
    return flow(result.get("proof_flow"));
  }

  private static LocalDate date(JsonPlace at) throws ClaimRefuted {
    try {
      return LocalDate.parse(at.text());
    } catch (DateTimeParseException e) {
      throw at.wrong("a date");
    }
  }

  private static long slopeUnits(JsonPlace at) throws ClaimRefuted {
    if (at.whole() < 1) {
      throw at.wrong("at least 1");
    }
    return at.whole();
  }

  private ClaimedStep step(JsonPlace at) throws ClaimRefuted {
    return new ClaimedStep(
        ticks(at, "from_duration"), ticks(at, "to_duration"), changes(at.get("changes")));
  }

  private List<Change> changes(JsonPlace at) throws ClaimRefuted {
    if (network.hasChoices()) {
      // Measures change too: what a step does is counted from the plans at its ends.
      return List.of();
    }
    Set<Integer> seen = new HashSet<>();
    List<Change> changes = new ArrayList<>();
    for (JsonPlace change : at.items()) {
      int activity = activity(change.get("activity"));
      if (!seen.add(activity)) {
        throw change.get("activity").wrong("each activity once");
      }
      long units = ticks(change, "units");
      if (units <= 0) {
        throw change.get("units").wrong("more than 0");
      }
      boolean relaxed = change.get("change").text().equals("relax");
      changes.add(new Change(activity, relaxed ? -units : units));
    }
    return changes;
  }

  private Plan plan(JsonPlace at) throws ClaimRefuted {
    long[] durations = Plan.allNormal(network).toArray();
    put(at.get("durations"), durations);
    int[] measures = measures(at);
    for (int i = 0; i < durations.length; i++) {
      if (measures[i] != Plan.NO_MEASURE) {
        durations[i] = network.measures().get(measures[i]).duration();
      } else if (durations[i] < network.activity(i).crash()
          || durations[i] > network.activity(i).normal()) {
        String id = network.activity(i).id();
        throw at.get("durations").get(id).wrong("from crash to normal duration");
      }
    }
    Plan plan = Plan.of(durations).using(measures);
    if (of.isPlain() || (of.momentMoney().isNone() && at.find("starts").isEmpty())) {
      return plan;
    }
    Timing earliest = Timing.earliest(network, plan);
    long[] starts = IntStream.range(0, durations.length).mapToLong(earliest::earlyStart).toArray();
    put(at.get("starts"), starts);
    return plan.startingAt(starts);
  }

  private int[] measures(JsonPlace at) throws ClaimRefuted {
    int[] measures = new int[network.size()];
    Arrays.fill(measures, Plan.NO_MEASURE);
    Optional<JsonPlace> used = at.find("measures");
    if (used.isEmpty()) {
      return measures;
    }
    for (String id : used.get().members().keySet()) {
      JsonPlace named = used.get().get(id);
      int activity = network.indexOf(id).orElseThrow(() -> named.wrong("an activity before it"));
      String name = named.text();
      measures[activity] =
          Arrays.stream(network.measures().of(activity))
              .filter(m -> network.measures().get(m).name().equals(name))
              .findFirst()
              .orElseThrow(() -> named.wrong("a measure of the activity"));
    }
    return measures;
  }

  private void put(JsonPlace at, long[] times) throws ClaimRefuted {
    for (String id : at.members().keySet()) {
      int activity = network.indexOf(id).orElseThrow(() -> at.wrong(id + " to be an activity"));
      times[activity] = ticks(at, id);
    }
  }

  private List<Flow.Entry> flow(JsonPlace at) throws ClaimRefuted {
    List<Flow.Entry> entries = new ArrayList<>();
    Set<String> known = new HashSet<>();
    for (Flow.Over over : Flow.Over.values()) {
      known.add(EvidenceJson.kind(over));
      Optional<JsonPlace> kind = at.find(EvidenceJson.kind(over));
      if (kind.isPresent()) {
        for (Map.Entry<String, JsonValue> entry : kind.get().members().entrySet()) {
          JsonPlace amount = kind.get().get(entry.getKey());
          entries.add(new Flow.Entry(over, index(over, entry.getKey(), amount), amount.whole()));
        }
      }
    }
    for (String name : at.members().keySet()) {
      if (!known.contains(name)) {
        throw at.get(name).wrong("a kind that is known");
      }
    }
    return entries;
  }

  private int index(Flow.Over over, String name, JsonPlace at) throws ClaimRefuted {
    if (over != Flow.Over.LINK && over != Flow.Over.SPAN) {
      return network.indexOf(name).orElseThrow(() -> at.wrong("an activity's name before it"));
    }
    int size = over == Flow.Over.LINK ? network.links().size() : of.momentMoney().spans().size();
    return IntStream.range(0, size)
        .filter(i -> String.valueOf(i + 1).equals(name))
        .findFirst()
        .orElseThrow(() -> at.wrong("a number from 1 to " + size + " before it"));
  }

  private Obstacle obstacle(JsonPlace at) throws ClaimRefuted {
    long ticks = ticks(at, "units");
    String term = at.get("term").text();
    return switch (term) {
      case "at_shortest" -> new Obstacle.AtShortest(activity(at.get("activity")), ticks);
      case "cannot_be_longer" -> new Obstacle.CannotBeLonger(activity(at.get("activity")), ticks);
      case "not_before" -> new Obstacle.NotBefore(activity(at.get("activity")), ticks);
      case "not_finished_before" ->
          new Obstacle.NotFinishedBefore(activity(at.get("activity")), ticks);
      case "lag" -> new Obstacle.Lag(link(at, ticks), ticks);
      default -> throw at.get("term").wrong("a term that is known");
    };
  }

  /** Of several links between the same events the one with this lag, if there is one. */
  private int link(JsonPlace at, long lag) throws ClaimRefuted {
    int from = activity(at.get("predecessor"));
    int to = activity(at.get("successor"));
    String relation = at.get("relation").text();
    int found = -1;
    for (int j = 0; j < network.links().size(); j++) {
      Link link = network.link(j);
      boolean isMeant =
          link.predecessor() == from
              && link.successor() == to
              && link.relation().name().equals(relation);
      if (isMeant && (found < 0 || link.lag() == lag)) {
        found = j;
      }
    }
    if (found < 0) {
      throw at.wrong("a link of the case");
    }
    return found;
  }

  private Unproved unproved(JsonPlace at) throws ClaimRefuted {
    return new Unproved(ticks(at, "duration"), money(at.get("cost")), money(at.get("bound")));
  }

  private CrossCheck crossCheck(JsonPlace at) throws ClaimRefuted {
    return new CrossCheck(
        each(
            at.get("points"),
            point ->
                new CrossCheck.Comparison(
                    ticks(point, "duration"),
                    money(point.get("stepping_cost")),
                    point.get("lp_cost").number())),
        (int) at.get("at_breakpoints").ticks(TimeScale.WHOLE),
        (int) at.get("of_points").ticks(TimeScale.WHOLE),
        each(
            at.get("unanswered"),
            point ->
                new CrossCheck.Unanswered(ticks(point, "duration"), point.get("reason").text())));
  }

  private static Money money(JsonPlace at) throws ClaimRefuted {
    return Money.of(at.number());
  }

  private int activity(JsonPlace at) throws ClaimRefuted {
    return network.indexOf(at.text()).orElseThrow(() -> at.wrong("an activity of the case"));
  }

  private long ticks(JsonPlace at, String name) throws ClaimRefuted {
    return at.get(name).ticks(scale);
  }

  /** Reads an item. */
  @FunctionalInterface
  private interface Item<T> {
    T at(JsonPlace place) throws ClaimRefuted;
  }

  private static <T> List<T> each(JsonPlace array, Item<T> item) throws ClaimRefuted {
    List<T> all = new ArrayList<>();
    for (JsonPlace place : array.items()) {
      all.add(item.at(place));
    }
    return all;
  }
}

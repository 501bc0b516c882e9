package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Evidence;
import dayworth.engine.Flow;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;

/**
 * What {@code dayworth verify} needs beside the figures: plans, and the flows that prove them.
 *
 * <p>A flow names what it runs over: an activity by its id, a link or a span by its place among
 * those of the case, from 1 on. A plan tells only the durations that are not normal and the starts
 * that are not as early as its durations allow.
 */
final class EvidenceJson {

  private final CurveAnswer answer;
  private final Network network;
  private final CaseJson names;

  EvidenceJson(CurveAnswer answer) {
    this.answer = answer;
    this.network = answer.of().network();
    this.names = new CaseJson(network);
  }

  void write(JsonText json) throws IOException {
    Evidence evidence = answer.evidence();
    json.number("time_decimals", network.scale().decimals());
    json.number("slope_units", BigDecimal.valueOf(evidence.slopeUnits()));
    json.number("most_flow_entries", Evidence.MOST_ENTRIES);
    if (evidence.flows().isPresent()) {
      json.array("flows", evidence.flows().get(), this::flow);
    } else {
      json.nothing("flows");
    }
    json.array(
        "plans",
        evidence.plans().entrySet(),
        (members, entry) -> plan(members, entry.getKey(), entry.getValue()));
    json.array("breakpoint_plans", breakpoints(), this::plan);
    json.object("as_planned", members -> plan(members, evidence.asPlanned()));
    json.object("crash_everything", members -> plan(members, evidence.crashEverything()));
  }

  /** Where no money hangs on starts the steps tell all but the first plan. */
  private List<Plan> breakpoints() {
    List<Plan> scheduled = answer.curve().scheduled();
    return scheduled.isEmpty() ? List.of(answer.curve().firstPlan()) : scheduled;
  }

  void flow(JsonText json, List<Flow.Entry> entries) throws IOException {
    for (Flow.Over over : Flow.Over.values()) {
      List<Flow.Entry> along = entries.stream().filter(entry -> entry.over() == over).toList();
      if (!along.isEmpty()) {
        json.object(
            kind(over),
            members -> {
              for (Flow.Entry entry : along) {
                members.number(name(entry), BigDecimal.valueOf(entry.amount()));
              }
            });
      }
    }
  }

  static String kind(Flow.Over over) {
    return over.name().toLowerCase(Locale.ROOT);
  }

  private String name(Flow.Entry entry) {
    return entry.over() == Flow.Over.LINK || entry.over() == Flow.Over.SPAN
        ? String.valueOf(entry.index() + 1)
        : names.id(entry.index());
  }

  private void plan(JsonText json, long finish, Plan plan) throws IOException {
    json.number("duration", names.units(finish));
    plan(json, plan);
  }

  private void plan(JsonText json, Plan plan) throws IOException {
    json.object(
        "durations",
        members -> {
          for (int i = 0; i < plan.size(); i++) {
            Activity activity = network.activity(i);
            if (plan.duration(i) != activity.normal() && plan.measure(i) == Plan.NO_MEASURE) {
              members.number(activity.id(), names.units(plan.duration(i)));
            }
          }
        });
    if (plan.usesMeasures()) {
      json.object(
          "measures",
          members -> {
            for (int i = 0; i < plan.size(); i++) {
              if (plan.measure(i) != Plan.NO_MEASURE) {
                members.text(names.id(i), network.measures().get(plan.measure(i)).name());
              }
            }
          });
    }
    if (plan.isScheduled()) {
      Timing timing = Timing.earliest(network, plan);
      json.object(
          "starts",
          members -> {
            for (int i = 0; i < plan.size(); i++) {
              if (plan.start(i) != timing.earlyStart(i)) {
                members.number(names.id(i), names.units(plan.start(i)));
              }
            }
          });
    }
  }
}

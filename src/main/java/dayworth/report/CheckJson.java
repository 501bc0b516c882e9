package dayworth.report;

import dayworth.decision.CheckAnswer;
import dayworth.network.Network;
import java.io.IOException;
import java.math.BigDecimal;

/** The members of a check's result. */
final class CheckJson {

  private final CheckAnswer answer;
  private final Dates dates;
  private final CaseJson names;

  CheckJson(CheckAnswer answer) {
    this.answer = answer;
    this.dates = new Dates(answer.of());
    this.names = new CaseJson(answer.of().network());
  }

  void write(JsonText json) throws IOException {
    Network network = answer.of().network();
    json.number("activities", network.size());
    json.number("links", network.links().size());
    json.number("as_planned", names.units(answer.asPlanned().finish()));
    if (dates.areKnown()) {
      json.text("as_planned_date", dates.finish(answer.asPlanned().finish()));
    }
    json.number("shortest", names.units(answer.shortest()));
    if (dates.areKnown()) {
      json.text("shortest_date", dates.finish(answer.shortest()));
    }
    json.number("critical_activities", answer.of().criticalCount(answer.asPlanned()));
    json.number("critical_chains", new BigDecimal(answer.chainCount()));
    json.array(
        "first_chains",
        answer.firstChains(),
        (members, chain) -> members.texts("activities", names.ids(chain)));
    json.array(
        "near_critical",
        answer.nearCritical(),
        (members, activity) -> {
          members.text("activity", names.id(activity));
          members.number("total_float", names.units(answer.asPlanned().totalFloat(activity)));
        });
    json.texts("open_starts", names.ids(answer.openStarts()));
    json.texts("open_ends", names.ids(answer.openEnds()));
    json.array(
        "never_critical",
        answer.neverCritical(),
        (members, never) -> {
          members.text("activity", names.id(never.activity()));
          members.number("longest_chain", names.units(never.longestThrough()));
        });
  }
}

package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.ClaimRefuted;
import dayworth.decision.ClaimedCurve;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Fault;
import dayworth.decision.MeetAnswer;
import dayworth.decision.Recount;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Rechecks one result: the claims that all rests on are proved from the case, what follows from
 * them is counted and written once more, and the two texts are compared.
 */
final class ResultCheck {

  /** A case keeps its result when its folder gets another name. */
  private static final String NAME = "case.name";

  /** Of branches the case tells only in part. */
  private static final Set<String> BRANCHED =
      Set.of(NAME, "proof_sheet.blocks", "proof_sheet.bound", "proof_sheet.rounding");

  private final JsonPlace all;
  private final String command;
  private final String programVersion;
  private final Case of;
  private final List<Fault> faults = new ArrayList<>();
  private final List<String> checked = new ArrayList<>();
  private final List<String> unchecked = new ArrayList<>();

  ResultCheck(JsonPlace all, String command, String programVersion, Case of) {
    this.all = all;
    this.command = command;
    this.programVersion = programVersion;
    this.of = of;
    checked.add(Wording.count(of.inputs().size(), "input file", "input files") + " by digest");
  }

  Verification verification() throws ClaimRefuted {
    switch (command) {
      case "curve" -> curve();
      case "meet" -> meet();
      default -> headOnly();
    }
    return new Verification(faults, checked, unchecked);
  }

  private void curve() throws ClaimRefuted {
    ClaimedCurve claim = new ClaimReader(of, all).curve();
    CurveAnswer answer = Recount.curve(of, claim);
    compare(ResultJson.ofCurve(answer, programVersion), Set.of(NAME));
    tell(answer);
  }

  private void meet() throws ClaimRefuted {
    ClaimReader reader = new ClaimReader(of, all);
    MeetAnswer answer = Recount.meet(of, reader.curve(), reader.wish(), reader.proofFlow());
    boolean isConvex = of.isConvex();
    String right = ResultJson.ofMeet(answer, programVersion);
    if (isConvex) {
      compare(right, Set.of(NAME));
      checked.add("the proof sheet, from its flow");
    } else {
      compare(right, BRANCHED);
      branches(right);
    }
    tell(answer.curve());
  }

  /** What the plan pays is counted; the branches are added up as they stand. */
  private void branches(String right) throws ClaimRefuted {
    JsonPlace sheet = all.get("proof_sheet");
    faults.addAll(BlockCheck.of(of.network(), sheet));
    JsonPlace ought = new JsonPlace("", parsed(right)).get("proof_sheet").get("blocks");
    faults.addAll(
        ResultComparison.ofPart(sheet.get("blocks").items().get(0), ought.items().get(0).value()));
    checked.add("each branch of the proof sheet: it balances, and allows no less than the plan");
    unchecked.add(
        "that the branches leave no plan out, their lags, and how each prices choices and sections");
  }

  private void tell(CurveAnswer answer) {
    int rows = answer.rows().size();
    checked.add(Wording.count(rows, "finish", "finishes") + ", all their money and dates");
    checked.add(Wording.count(answer.steps().size(), "step", "steps") + ", prices and changes");
    checked.add("the plan: durations, costs, times and floats");
    checked.add("the chain that makes the shortest finish the shortest");
    if (answer.evidence().flows().isPresent()) {
      checked.add("that no plan is cheaper, at every finish, by " + flows(answer));
    } else if (of.isConvex()) {
      unchecked.add("that no plan is cheaper: the flows are too many to be in the result");
    } else {
      searched(answer);
    }
    int asked = answer.crossCheck().comparisons().size();
    if (asked > 0) {
      String points = Wording.count(asked, "point", "points");
      if (of.isConvex()) {
        checked.add("what is told of the linear programme, which agrees at " + points);
      } else {
        unchecked.add("what the two ways found in single branches, at " + points);
      }
    }
  }

  private void searched(CurveAnswer answer) {
    int open = answer.unproved().size();
    if (!Recount.isSearched(of, answer.evidence().relaxations())) {
      unchecked.add("that no plan is cheaper: searching once more would take too long");
      return;
    }
    checked.add("that no plan is cheaper, by searching once more and counting every bound anew");
    if (open > 0) {
      unchecked.add("the bounds of " + Wording.count(open, "finish", "finishes") + " not proved");
    }
  }

  private static String flows(CurveAnswer answer) {
    return Wording.count(answer.evidence().flows().orElseThrow().size(), "flow", "flows");
  }

  private void headOnly() throws ClaimRefuted {
    JsonValue head = parsed(ResultJson.ofHead(of, command, programVersion));
    Map<String, JsonValue> found = new LinkedHashMap<>(all.members());
    found.keySet().retainAll(((JsonValue.Members) head).byName().keySet());
    faults.addAll(ResultComparison.of(new JsonValue.Members(found), head, Set.of(NAME)));
    checked.add("the case, its status and its warnings");
    unchecked.add("any figure: a result of " + command + " carries no proof; curve and meet do");
  }

  private void compare(String right, Set<String> leftOut) {
    faults.addAll(ResultComparison.of(all.value(), parsed(right), leftOut));
  }

  private static JsonValue parsed(String text) {
    try {
      return JsonValue.read(text.getBytes(StandardCharsets.UTF_8));
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }
}

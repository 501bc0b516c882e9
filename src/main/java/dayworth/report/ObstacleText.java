package dayworth.report;

import dayworth.decision.Case;
import dayworth.engine.Curve;
import dayworth.engine.Obstacle;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.List;

/** Says why the project cannot be shorter. */
final class ObstacleText {

  private static final int MOST_TERMS = 12;
  private static final int IDS_WIDTH = 120;

  private final Case of;
  private final long shortest;
  private final Network network;
  private final List<Obstacle> terms;

  ObstacleText(Case of, Curve curve) {
    this.of = of;
    this.shortest = curve.shortest();
    this.network = of.network();
    this.terms = curve.obstacles().stream().filter(term -> term.ticks() != 0).toList();
  }

  String sentence() {
    String start = Wording.duration(of, shortest) + " is the shortest";
    if (terms.isEmpty()) {
      return start + ".";
    }
    if (terms.stream().allMatch(Obstacle.AtShortest.class::isInstance)) {
      List<String> ids =
          terms.stream().map(term -> id(((Obstacle.AtShortest) term).activity())).toList();
      String who = ids.size() == 1 ? ids.get(0) : "every activity of " + cut(ids);
      return start + ": " + Wording.safe(who) + " is at its shortest.";
    }
    String sum = terms.size() == 1 ? "" : ": " + sum();
    return start + Wording.safe(sum + String.join("", reasons())) + ".";
  }

  private static String cut(List<String> ids) {
    return Wording.ids(ids, IDS_WIDTH);
  }

  private String sum() {
    StringBuilder sum = new StringBuilder();
    long rest = 0;
    for (int i = 0; i < terms.size(); i++) {
      if (i < MOST_TERMS) {
        append(sum, name(terms.get(i)), terms.get(i).ticks());
      } else {
        rest += terms.get(i).ticks();
      }
    }
    if (terms.size() > MOST_TERMS) {
      append(sum, (terms.size() - MOST_TERMS) + " more terms ", rest);
    }
    return sum + " = " + units(shortest);
  }

  private void append(StringBuilder sum, String name, long ticks) {
    String sign = ticks < 0 ? " - " : " + ";
    sum.append(sum.isEmpty() && ticks >= 0 ? "" : sign).append(name).append(units(Math.abs(ticks)));
  }

  private String name(Obstacle term) {
    if (term instanceof Obstacle.AtShortest at) {
      return id(at.activity()) + " ";
    }
    if (term instanceof Obstacle.CannotBeLonger longer) {
      return id(longer.activity()) + " ";
    }
    return "";
  }

  private List<String> reasons() {
    List<String> reasons = new ArrayList<>();
    for (Obstacle term : terms.subList(0, Math.min(MOST_TERMS, terms.size()))) {
      if (term instanceof Obstacle.CannotBeLonger longer) {
        String most = units(Math.abs(longer.ticks()));
        reasons.add(": " + id(longer.activity()) + " cannot be longer than " + most);
      } else if (term instanceof Obstacle.NotBefore start) {
        String when = units(start.ticks());
        String date = new Dates(of).spokenStart(" (", start.ticks(), ")");
        reasons.add(": " + id(start.activity()) + " may not start before " + when + date);
      } else if (term instanceof Obstacle.NotFinishedBefore finish) {
        String when = Wording.finish(of, finish.ticks());
        reasons.add(": " + id(finish.activity()) + " may not finish before " + when);
      }
    }
    return reasons.stream()
        .map(reason -> reasons.get(0).equals(reason) ? reason : ";" + reason.substring(1))
        .toList();
  }

  private String id(int activity) {
    return network.activity(activity).id();
  }

  private String units(long ticks) {
    return Wording.grouped(network.scale().units(ticks));
  }
}

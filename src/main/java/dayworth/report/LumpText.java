package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;

/**
 * Says where several units of earlier finish come together: measures are bought wholly or not at
 * all, so a unit can cost more by itself than as one of many.
 *
 * <p>Such stretches are the pieces of the lower convex hull of the rows that pass below rows
 * between their ends.
 */
final class LumpText {

  private static final int MOST = 3;

  private final CurveAnswer answer;
  private final Case of;
  private final List<Finish> rows;

  /** The rows on the hull, from long to short, by their place. */
  private final List<Integer> hull = new ArrayList<>();

  LumpText(CurveAnswer answer) {
    this.answer = answer;
    this.of = answer.of();
    this.rows = answer.shown().rows();
    for (int k = 0; k < rows.size(); k++) {
      while (hull.size() > 1 && isAbove(hull.get(hull.size() - 2), hull.get(hull.size() - 1), k)) {
        hull.remove(hull.size() - 1);
      }
      hull.add(k);
    }
  }

  /** Empty where every unit can be had at the price of its neighbours, or dearer. */
  String sentence() {
    if (!of.network().hasChoices()) {
      return "";
    }
    List<String> said = new ArrayList<>();
    int more = 0;
    for (int h = 1; h < hull.size(); h++) {
      int from = hull.get(h - 1);
      int to = hull.get(h);
      // What lies before the least total has been bought with it.
      if (to - from > 1 && rows.get(to).duration() < answer.leastTotal().duration()) {
        if (said.size() < MOST) {
          said.add(lump(from, to));
        } else {
          more++;
        }
      }
    }
    String rest =
        more == 0
            ? ""
            : " "
                + Wording.count(more, "other stretch comes", "other stretches come")
                + " together.";
    return String.join(" ", said) + rest;
  }

  private String lump(int from, int to) {
    Money all = cost(to).minus(cost(from));
    Money first = cost(from + 1).minus(cost(from));
    long ticks = rows.get(from).duration() - rows.get(to).duration();
    MoneyLook look = MoneyLook.of(List.of(all.cents(), first.cents()));
    String next = Wording.duration(of, rows.get(from + 1).duration());
    String together = Wording.duration(of, ticks) + " come together for " + look.text(all.cents());
    if (first.cents().compareTo(all.cents()) == 0) {
      return next + " cannot be had singly: " + together + ".";
    }
    return next
        + " by itself costs "
        + look.text(first.cents())
        + "; to "
        + Wording.duration(of, rows.get(to).duration())
        + " "
        + together
        + ".";
  }

  private Money cost(int row) {
    return answer.priced(rows.get(row));
  }

  /** Whether the middle one of three rows costs more than the line through the others says. */
  private boolean isAbove(int longer, int middle, int shorter) {
    return rise(longer, middle).compareTo(rise(middle, shorter)) > 0;
  }

  private Money rise(int longer, int shorter) {
    return cost(shorter)
        .minus(cost(longer))
        .dividedBy(rows.get(longer).duration() - rows.get(shorter).duration());
  }
}

package dayworth.buildup;

import dayworth.value.Quantity;
import java.util.List;

/**
 * The share of the output that is lost in each week of a spell of a pattern, with where it is known
 * from. Beyond the last week its value holds.
 *
 * @param weeks the first week of the spell first; empty where nothing is lost
 */
public record OutputLoss(List<Week> weeks) {

  public static final OutputLoss NONE = new OutputLoss(List.of());

  private static final Quantity ALL = Quantity.ONE;

  /**
   * A week of a spell.
   *
   * @param loss of what the same hours yield at the normal pattern; below 1; below 0 for a gain
   * @param source where the figure is from, as its owner puts it; may be empty
   */
  public record Week(Quantity loss, String source) {

    public Week {
      if (loss.compareTo(ALL) >= 0) {
        throw new IllegalArgumentException("some output is left");
      }
    }
  }

  public OutputLoss {
    weeks = List.copyOf(weeks);
  }

  /** The share lost in a week, 1 for the first of the spell. */
  public Quantity in(int week) {
    return weeks.isEmpty() ? Quantity.ZERO : at(week).loss();
  }

  /** The different sources of the first so many weeks, in their order. */
  public List<String> sources(int upTo) {
    return weeks.stream().limit(upTo).map(Week::source).distinct().toList();
  }

  private Week at(int week) {
    return weeks.get(Math.min(week, weeks.size()) - 1);
  }
}

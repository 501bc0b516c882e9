package dayworth.engine;

import dayworth.network.Network;
import dayworth.value.SlopeScale;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * The dual side of a point of the curve: how much money per tick runs over each constraint, in
 * units of a slope scale. It carries no lengths and no limits: a checker takes those from the
 * activities and links themselves.
 */
public final class Flow {

  /**
   * What a unit of flow runs over; all are indexed by activity but {@link #LINK} and {@link #SPAN}.
   */
  public enum Over {
    /** Start to finish, over the normal duration; at most the activity's cost slope. */
    SLOPE,
    /** Start to finish, over the crash duration: it cannot be shorter. */
    CRASH,
    /** Finish to start: it cannot be longer than normal. */
    BACK_OVER_NORMAL,
    /** Finish to start, where crashing is cheaper: each tick above crash costs the slope. */
    BACK_OVER_CRASH,
    /** Project start to the activity's start, over its not-before time. */
    FROM_PROJECT,
    /** Project start to the activity's finish, over its not-finished-before time. */
    FROM_PROJECT_TO_FINISH,
    /** The activity's finish to the project finish. */
    TO_PROJECT,
    /** A link, by its index. */
    LINK,
    /** Back over a span, from its later moment to its earlier one; at most the span's rate. */
    SPAN
  }

  private final SlopeScale scale;
  private final Map<Over, long[]> amounts = new EnumMap<>(Over.class);

  /** No flow at all: the bound that nothing is cheaper than the cheapest way of each activity. */
  public Flow(SlopeScale scale, Network network) {
    this.scale = scale;
    for (Over over : Over.values()) {
      amounts.put(over, new long[size(over, network)]);
    }
  }

  private Flow(Flow other) {
    this.scale = other.scale;
    other.amounts.forEach((over, amount) -> amounts.put(over, amount.clone()));
  }

  /**
   * What runs over one constraint.
   *
   * @param amount units of the slope scale
   */
  public record Entry(Over over, int index, long amount) {}

  /** A flow of what its entries say and nothing else. */
  public static Flow of(SlopeScale scale, Network network, List<Entry> entries) {
    Flow flow = new Flow(scale, network);
    entries.forEach(entry -> flow.set(entry.over(), entry.index(), entry.amount()));
    return flow;
  }

  /** What is not zero, by kind and then by index. */
  public List<Entry> entries() {
    List<Entry> entries = new ArrayList<>();
    amounts.forEach(
        (over, all) -> {
          for (int index = 0; index < all.length; index++) {
            if (all[index] != 0) {
              entries.add(new Entry(over, index, all[index]));
            }
          }
        });
    return entries;
  }

  /** A flow of the same amounts that keeps them when this one changes. */
  public Flow copy() {
    return new Flow(this);
  }

  private static int size(Over over, Network network) {
    return switch (over) {
      case LINK -> network.links().size();
      case SPAN -> network.spans().size();
      default -> network.size();
    };
  }

  /** What one unit of flow is worth. */
  public SlopeScale scale() {
    return scale;
  }

  public long get(Over over, int index) {
    return amounts.get(over)[index];
  }

  public void set(Over over, int index, long amount) {
    amounts.get(over)[index] = amount;
  }
}

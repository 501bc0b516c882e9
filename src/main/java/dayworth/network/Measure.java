package dayworth.network;

import dayworth.value.Money;
import java.util.OptionalInt;

/**
 * A way to do an activity that is taken wholly or not at all: a second shift, a bigger crew,
 * another method.
 *
 * @param activity index in its network
 * @param name for people; unique among the measures of the activity
 * @param duration how long the activity takes this way, ticks
 * @param cost direct cost of the whole activity done this way
 * @param inPackage the index of the package whose cost is paid with it; empty for none
 * @param ofRemaining whether duration and cost are of the work that is to go, so that it serves
 *     started work too
 * @param note for people; may be empty
 */
public record Measure(
    int activity,
    String name,
    long duration,
    Money cost,
    OptionalInt inPackage,
    boolean ofRemaining,
    String note) {

  public Measure {
    if (activity < 0 || duration < 0) {
      throw new IllegalArgumentException("measure " + name + ": of no activity, or below 0 ticks");
    }
  }
}

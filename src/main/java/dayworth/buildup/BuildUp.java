package dayworth.buildup;

import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.util.List;
import java.util.Optional;

/**
 * What working patterns buy in all activities whose labour is known.
 *
 * @param lossFactor what all losses of output were multiplied by; 1 leaves them as they are
 * @param patterns the normal one first; their losses are already multiplied; empty where no labour
 *     is known
 * @param activities in the order of the case
 */
public record BuildUp(
    Quantity lossFactor, List<Pattern> patterns, List<ActivityBuildUp> activities) {

  /** No labour is known. */
  public static final BuildUp NONE = new BuildUp(Quantity.ONE, List.of(), List.of());

  /** Losses are never multiplied by more: it bounds what a result may claim. */
  public static final Quantity MOST_LOSS_FACTOR = Quantity.of(100);

  /** In what durations are counted here. */
  public static final TimeScale SCALE = new TimeScale(TimeScale.MOST_DECIMALS);

  /** No spell is longer, ten years: it bounds the table. */
  public static final int MOST_WEEKS = 520;

  public BuildUp {
    patterns = List.copyOf(patterns);
    activities = List.copyOf(activities);
  }

  /** Whether no labour is known, so that no answer rests on any loss of output. */
  public boolean isNone() {
    return patterns.isEmpty();
  }

  /** Of one activity; empty if its labour is not known or it is finished. */
  public Optional<ActivityBuildUp> of(int activity) {
    return activities.stream().filter(one -> one.activity() == activity).findFirst();
  }

  /** The spell that a measure of an activity stands for; empty where it is built up from none. */
  public Optional<Way> spell(int activity, String measure) {
    return of(activity)
        .flatMap(built -> built.measures().filter(way -> way.name().equals(measure)).findFirst());
  }

  /** The patterns that can be bought. */
  public List<Pattern> bought() {
    return patterns.isEmpty() ? List.of() : patterns.subList(1, patterns.size());
  }
}

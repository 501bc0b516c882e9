package dayworth.decision;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Caution;
import dayworth.buildup.Pattern;
import dayworth.value.Quantity;
import java.util.List;
import java.util.OptionalInt;

/**
 * What working patterns cost and buy: the answer of {@code dayworth buildup}.
 *
 * @param asked the index of the one activity that is asked about; empty for all
 */
public record BuildUpAnswer(Case of, OptionalInt asked) {

  public BuildUp all() {
    return of.buildUp();
  }

  /** What is to be shown: of the activity that is asked about, or of all. */
  public List<ActivityBuildUp> shown() {
    return asked.isEmpty() ? all().activities() : all().of(asked.getAsInt()).stream().toList();
  }

  /** What a pattern asks care for, at its longest spell that is offered anywhere. */
  public List<Caution> cautions(Pattern pattern) {
    Quantity longest =
        all().activities().stream()
            .flatMap(ActivityBuildUp::measures)
            .filter(way -> way.spell().pattern().equals(pattern))
            .map(way -> way.spell().weeks())
            .reduce(Quantity.ZERO, Quantity::max);
    return Caution.of(pattern, all().patterns().get(0), longest);
  }
}

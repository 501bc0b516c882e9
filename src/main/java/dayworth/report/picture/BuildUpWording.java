package dayworth.report.picture;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Pattern;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import java.util.List;
import java.util.stream.Collectors;

/** What the picture of a build-up says in words. */
final class BuildUpWording {

  private final BuildUpAnswer answer;
  private final Words words;
  private final int leftOut;

  /**
   * For an answer.
   *
   * @param leftOut how many activities the picture does not show
   */
  BuildUpWording(BuildUpAnswer answer, int leftOut) {
    this.answer = answer;
    this.words = new Words(answer.of());
    this.leftOut = leftOut;
  }

  /** The finding: how many spells gain nothing, for that is what a sum without losses hides. */
  String title() {
    List<Way> ways = answer.shown().stream().flatMap(built -> built.ways().stream()).toList();
    int useless = (int) ways.stream().filter(way -> !way.verdict().isMeasure()).count();
    String of =
        answer.asked().isPresent()
            ? Words.safe(answer.of().network().activity(answer.asked().getAsInt()).id()) + ": "
            : "";
    String all = Words.count(ways.size(), "spell", "spells");
    return of
        + (useless == 0
            ? "none of " + all + " is beaten by another"
            : Words.count(useless, "of " + all + " gains nothing", "of " + all + " gain nothing"));
  }

  String note() {
    String more =
        leftOut == 0
            ? ""
            : " " + Words.count(leftOut, "activity is", "activities are") + " left out.";
    return words.project()
        + ". Duration and extra cost of each activity against the weeks that are worked at a"
        + " pattern before the normal one. A disc is offered as a measure; an empty ring is"
        + " dominated: something else is as quick and no dearer. The axes of duration do not begin"
        + " at zero. Losses of output are the case's own assumptions."
        + words.amountsIn()
        + more;
  }

  String description() {
    return answer.shown().stream().map(this::told).collect(Collectors.joining(" "));
  }

  private String told(ActivityBuildUp built) {
    String id = Words.safe(answer.of().network().activity(built.activity()).id());
    String each =
        answer.all().bought().stream()
            .map(pattern -> told(built, pattern))
            .collect(Collectors.joining("; "));
    return id + ", normally " + units(built.normal()) + ": " + each + ".";
  }

  private String told(ActivityBuildUp built, Pattern pattern) {
    List<Way> ways = built.ways(pattern);
    Way last = ways.get(ways.size() - 1);
    return Words.safe(last.name())
        + " "
        + units(last.duration())
        + ", "
        + words.money(last.spell().extra().total().cents())
        + " more";
  }

  private String units(long duration) {
    return words.time(answer.of().network().scale().ticks(BuildUp.SCALE.units(duration)));
  }
}

package dayworth.report.picture;

import dayworth.buildup.ActivityBuildUp;
import dayworth.decision.BuildUpAnswer;
import java.util.List;

/**
 * Duration and extra cost against the weeks of each pattern, an activity below the other. A spell
 * that is offered is a disc; one that gains nothing is an empty ring.
 */
final class BuildUpPicture implements Picture {

  private static final Layout LAYOUT = new Layout(568, 0);
  private static final double ROW = 186;
  private static final double BOTTOM = 20;

  /** More rows than a reader compares: the others are in the tables. */
  private static final int MOST_ACTIVITIES = 12;

  private final BuildUpAnswer answer;
  private final List<ActivityBuildUp> shown;
  private final BuildUpWording wording;
  private final Heading heading;
  private final SpellKey key;

  BuildUpPicture(BuildUpAnswer answer) {
    this.answer = answer;
    List<ActivityBuildUp> all = answer.shown();
    shown = all.subList(0, Math.min(MOST_ACTIVITIES, all.size()));
    wording = new BuildUpWording(answer, all.size() - shown.size());
    heading = new Heading(LAYOUT, wording.title(), wording.note());
    key = new SpellKey(answer.all().bought(), LAYOUT.textWidth());
  }

  @Override
  public int width() {
    return LAYOUT.width();
  }

  @Override
  public int height() {
    return (int) Math.ceil(heading.height() + key.height() + shown.size() * ROW + BOTTOM);
  }

  @Override
  public String title() {
    return wording.title();
  }

  @Override
  public String description() {
    return wording.description();
  }

  @Override
  public void paint(Sheet sheet) {
    heading.paint(sheet);
    key.paint(sheet, heading.height());
    double top = heading.height() + key.height();
    for (ActivityBuildUp built : shown) {
      new SpellRow(answer, built, top).paint(sheet);
      top += ROW;
    }
  }
}

package dayworth.report.picture;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Pattern;
import dayworth.buildup.Spell;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.network.Activity;
import java.math.RoundingMode;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** One activity of the picture of a build-up: its name, its durations and its extra costs. */
final class SpellRow {

  private static final double NAME_WIDTH = 168;
  private static final int MOST_LINES = 5;
  private static final double DURATION_X = 244;
  private static final double COST_X = 624;
  private static final double PANEL_WIDTH = 316;
  private static final double ABOVE = 26;
  private static final double PANEL_HEIGHT = 116;

  private final BuildUpAnswer answer;
  private final Words words;
  private final ActivityBuildUp built;
  private final double top;

  SpellRow(BuildUpAnswer answer, ActivityBuildUp built, double top) {
    this.answer = answer;
    this.words = new Words(answer.of());
    this.built = built;
    this.top = top;
  }

  void paint(Sheet sheet) {
    paintNames(sheet);
    double normal = BuildUp.SCALE.units(built.normal()).doubleValue();
    SpellPanel durations = panel(DURATION_X, normal, SpellRow::duration, false);
    durations.paint(sheet, "Duration, " + words.many(), words);
    SpellPanel costs = panel(COST_X, 0, SpellRow::extra, true);
    costs.paint(sheet, "Extra cost", words);
  }

  private SpellPanel panel(double x, double atNone, ToDoubleFunction<Way> value, boolean fromZero) {
    SpellPanel panel =
        new SpellPanel(new Box(x, top + ABOVE, PANEL_WIDTH, PANEL_HEIGHT), atNone, fromZero);
    List<Pattern> patterns = answer.all().bought();
    for (int i = 0; i < patterns.size(); i++) {
      Pen pen = Pen.PATTERNS.get(i % Pen.PATTERNS.size());
      List<SpellPanel.Point> points =
          built.ways(patterns.get(i)).stream()
              .map(way -> point(way, value.applyAsDouble(way)))
              .toList();
      panel.add(new SpellPanel.Line(Words.safe(patterns.get(i).name()), pen, points));
    }
    return panel;
  }

  private static SpellPanel.Point point(Way way, double value) {
    return new SpellPanel.Point(way.spell().weeks().toDouble(), value, way.verdict().isMeasure());
  }

  private static double duration(Way way) {
    return BuildUp.SCALE.units(way.duration()).doubleValue();
  }

  private static double extra(Way way) {
    Spell spell = way.spell();
    return spell.extra().total().toDouble();
  }

  private void paintNames(Sheet sheet) {
    Activity activity = answer.of().network().activity(built.activity());
    double y = top + ABOVE + Type.NAME.size() - 4;
    String id = Type.NAME.fit(Words.safe(activity.id()), NAME_WIDTH);
    sheet.text(Type.NAME, Look.INK, Sheet.Anchor.START, Layout.MARGIN, y, id);
    List<String> name = Type.AXIS.wrap(Words.safe(activity.name()), NAME_WIDTH);
    for (String line : name.subList(0, Math.min(MOST_LINES, name.size()))) {
      y += Type.NAME.leading();
      sheet.text(Type.AXIS, Look.INK, Sheet.Anchor.START, Layout.MARGIN, y, line);
    }
    y += Type.NAME.leading();
    sheet.text(Type.AXIS, Look.QUIET, Sheet.Anchor.START, Layout.MARGIN, y, labour());
  }

  private String labour() {
    String hours = words.amount(built.labour().hours().rounded(1, RoundingMode.HALF_UP));
    String crew = words.amount(built.labour().crew().rounded(1, RoundingMode.HALF_UP));
    return hours + " h, a crew of " + crew + (built.ofRemaining() ? ", to go" : "");
  }
}

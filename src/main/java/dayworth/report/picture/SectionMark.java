package dayworth.report.picture;

import dayworth.contract.Section;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.network.Moment;
import dayworth.network.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The latest of the finishes shown from which on a section is on time along the curve.
 *
 * @param name of the section
 */
record SectionMark(String name, Finish finish) {

  /** More would crowd the picture; all sections are in the tables. */
  private static final int MOST = 3;

  /** For each section that is late at the first finish and on time at a shorter one. */
  static List<SectionMark> of(CurveAnswer answer) {
    List<SectionMark> marks = new ArrayList<>();
    for (Section section : answer.of().momentMoney().sections()) {
      if (section.done().isEmpty() && marks.size() < MOST) {
        firstOnTime(answer, section)
            .filter(finish -> finish.duration() < answer.rows().get(0).duration())
            .ifPresent(finish -> marks.add(new SectionMark(section.name(), finish)));
      }
    }
    return marks;
  }

  private static Optional<Finish> firstOnTime(CurveAnswer answer, Section section) {
    return answer.rows().stream()
        .filter(
            row ->
                Optional.ofNullable(answer.evidence().plans().get(row.duration()))
                    .filter(plan -> isOnTime(plan, section))
                    .isPresent())
        .findFirst();
  }

  private static boolean isOnTime(Plan plan, Section section) {
    return plan.time(Moment.finishOf(section.activity())) <= section.due().ticks();
  }
}

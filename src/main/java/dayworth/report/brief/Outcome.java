package dayworth.report.brief;

import dayworth.contract.Due;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Case;
import dayworth.decision.Finish;
import java.math.BigDecimal;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Optional;

/** What comes of the chosen finish, beside carrying on as planned; all money rounded as told. */
final class Outcome {

  private final BriefAnswer answer;
  private final Finish planned;
  private final Finish chosen;

  Outcome(BriefAnswer answer) {
    this.answer = answer;
    this.planned = answer.curve().asPlanned();
    this.chosen = answer.finish();
  }

  Finish planned() {
    return planned;
  }

  Finish chosen() {
    return chosen;
  }

  Case of() {
    return answer.of();
  }

  /** Ticks that the chosen finish is earlier; below zero if it is later. */
  long gained() {
    return planned.duration() - chosen.duration();
  }

  /** What is the same in every choice: direct cost as planned and fixed cost. */
  BigDecimal sameForAll() {
    return planned.direct().cents().add(planned.other().fixed().cents());
  }

  /** A total without what is the same in every choice. */
  BigDecimal depends(Finish finish) {
    return finish.total().subtract(sameForAll());
  }

  BigDecimal extraDirect(Finish finish) {
    return finish.direct().cents().subtract(planned.direct().cents());
  }

  BigDecimal extraDirect() {
    return extraDirect(chosen);
  }

  BigDecimal timeRelatedSaved() {
    return timeRelated(planned).subtract(timeRelated(chosen));
  }

  BigDecimal runningSaved() {
    return running(planned).subtract(running(chosen));
  }

  BigDecimal damagesSaved() {
    return damages(planned).subtract(damages(chosen));
  }

  BigDecimal bonusGained() {
    return bonus(chosen).subtract(bonus(planned));
  }

  /** Everything beside direct cost that the chosen finish saves or brings. */
  BigDecimal saved() {
    return timeRelatedSaved().add(runningSaved()).add(damagesSaved()).add(bonusGained());
  }

  /** How much less the chosen finish costs in all; below zero if it costs more. */
  BigDecimal better() {
    return planned.total().subtract(chosen.total());
  }

  /** How much less a finish costs in all than carrying on. */
  BigDecimal better(Finish finish) {
    return planned.total().subtract(finish.total());
  }

  static BigDecimal timeRelated(Finish finish) {
    return finish.other().timeRelated().cents();
  }

  static BigDecimal running(Finish finish) {
    return finish.running().cents();
  }

  static BigDecimal damages(Finish finish) {
    return finish.other().damages().cents();
  }

  static BigDecimal bonus(Finish finish) {
    return finish.other().bonus().cents();
  }

  /** Whether any money beside direct cost hangs on the finish. */
  boolean hasWorth() {
    return hasTimeRelated() || hasRunning() || hasDamages() || hasBonus();
  }

  boolean hasTimeRelated() {
    return any(Outcome::timeRelated);
  }

  boolean hasRunning() {
    return any(Outcome::running);
  }

  boolean hasDamages() {
    return any(Outcome::damages);
  }

  boolean hasBonus() {
    return any(Outcome::bonus);
  }

  private boolean any(java.util.function.Function<Finish, BigDecimal> money) {
    return money.apply(planned).signum() != 0
        || answer.states().stream().anyMatch(state -> money.apply(state.finish()).signum() != 0);
  }

  Optional<Due> contract() {
    return of().terms().contractFinish();
  }

  /** How late a finish is, in words; empty without a contract finish. */
  Optional<String> lateness(Finish finish, Words words) {
    return contract().map(due -> lateness(finish, due, words));
  }

  private String lateness(Finish finish, Due due, Words words) {
    Optional<Long> days =
        due.date()
            .flatMap(
                date -> words.date(finish.duration()).map(at -> ChronoUnit.DAYS.between(date, at)));
    if (days.isPresent() && isByDate()) {
      long late = days.get();
      String count = Math.abs(late) + (Math.abs(late) == 1 ? " calendar day" : " calendar days");
      return late == 0 ? "on the day" : count + (late > 0 ? " late" : " early");
    }
    long late = finish.duration() - due.ticks();
    return late == 0
        ? "on time"
        : words.workingTime(Math.abs(late)) + (late > 0 ? " late" : " early");
  }

  private boolean isByDate() {
    return of().terms().damages().per().isByDate() || of().terms().damages().rate().isZero();
  }

  /** What the chosen finish saves or brings, each with its name. */
  String savedNames() {
    List<String> falls = new java.util.ArrayList<>();
    if (timeRelatedSaved().signum() > 0) {
      falls.add("time-related cost");
    }
    if (runningSaved().signum() > 0) {
      falls.add("running cost");
    }
    if (damagesSaved().signum() > 0) {
      falls.add("damages");
    }
    String text =
        falls.isEmpty()
            ? ""
            : Words.list(falls, 4)
                + " that "
                + (falls.size() == 1 && !falls.get(0).equals("damages") ? "does" : "do")
                + " not arise";
    List<String> rest = new java.util.ArrayList<>();
    if (bonusGained().signum() > 0) {
      rest.add((falls.isEmpty() ? "" : "and ") + "bonus that is earned");
    }
    if (runningSaved().signum() < 0) {
      rest.add("less running cost that is added");
    }
    if (timeRelatedSaved().signum() < 0) {
      rest.add("less time-related cost that is added");
    }
    if (damagesSaved().signum() < 0) {
      rest.add("less damages that are added");
    }
    if (bonusGained().signum() < 0) {
      rest.add("less bonus that is lost");
    }
    String more = String.join(", ", rest);
    return text.isEmpty()
        ? (more.isEmpty() ? "saved beside direct cost" : more)
        : more.isEmpty() ? text : text + (more.startsWith("and") ? " " : ", ") + more;
  }
}

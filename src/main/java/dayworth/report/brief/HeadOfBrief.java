package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.Submission;
import dayworth.report.brief.page.Document;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The answer before everything else: a sentence, a sum, and who asks whom. */
final class HeadOfBrief {

  private static final String NOT_STATED = "not stated";
  private static final int LARGE = 12;

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final Submission submission;

  HeadOfBrief(BriefAnswer answer, Words words, Outcome outcome) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.submission = answer.of().submission();
  }

  Document.Headline headline() {
    long gained = outcome.gained();
    String finish = words.longFinish(answer.finish().duration());
    String before = words.hasDates() ? "Finish on " : "Finish in ";
    if (gained == 0) {
      String why =
          answer.isLeastTotal()
              ? outcome.hasWorth()
                  ? ": no other finish costs less in all."
                  : ": nothing in the case makes an earlier finish worth its cost."
              : ": the finish that " + words.presentPlan() + " gives.";
      return new Document.Headline(
          words.hasDates() ? "Carry on and finish on " : "Carry on and finish in ", finish, why);
    }
    String how =
        ", "
            + words.workingTimeInWords(Math.abs(gained))
            + (gained > 0 ? " sooner than " : " later than ")
            + words.presentPlan()
            + ": ";
    return new Document.Headline(before, finish, how + worth() + ".");
  }

  /** What it costs beside what it saves, as far as a few words can say it. */
  private String worth() {
    BigDecimal extra = outcome.extraDirect();
    BigDecimal saved = outcome.saved();
    BigDecimal better = outcome.better();
    if (extra.signum() <= 0) {
      return better.signum() > 0
          ? "it saves " + words.money(better) + " in all"
          : better.signum() == 0
              ? "it costs the same in all"
              : "it costs " + words.money(better.negate()) + " more in all";
    }
    if (saved.signum() <= 0) {
      return "it costs " + words.money(better.negate());
    }
    BigDecimal times = saved.divide(extra, 0, RoundingMode.FLOOR);
    if (better.signum() < 0) {
      return "it costs " + words.money(better.negate()) + " more than it saves";
    }
    if (better.signum() == 0) {
      return "it saves what it costs";
    }
    if (times.compareTo(BigDecimal.valueOf(2)) < 0) {
      return "it saves more than it costs";
    }
    if (times.compareTo(BigDecimal.valueOf(LARGE)) > 0) {
      return "it saves more than " + LARGE + " times what it costs";
    }
    boolean exact = times.multiply(extra).compareTo(saved) == 0;
    String count = Words.number(times.intValueExact()) + " times";
    return "it saves "
        + (exact ? "" : "more than ")
        + (times.intValueExact() == 2 ? "twice" : count)
        + " what it costs";
  }

  Optional<Document.Sum> sum() {
    if (!outcome.hasWorth() || outcome.gained() == 0) {
      return Optional.empty();
    }
    BigDecimal better = outcome.better();
    boolean pays = Outcome.damages(outcome.planned()).signum() > 0;
    String than =
        "carrying on to "
            + words.finish(outcome.planned().duration())
            + (pays ? " and paying damages" : "");
    int shortened = answer.chosen().bought().size();
    return Optional.of(
        new Document.Sum(
            new Document.Addend(words.money(outcome.saved()), outcome.savedNames()),
            new Document.Addend(
                words.money(outcome.extraDirect()),
                "extra direct cost"
                    + (shortened == 0
                        ? ""
                        : " of shortening " + Words.count(shortened, "activity", "activities"))),
            new Document.Addend(
                words.money(better),
                better.signum() > 0
                    ? "better than " + than
                    : better.signum() == 0
                        ? "beside " + than
                        : "better, which is dearer, than " + than)));
  }

  List<String> lede() {
    List<String> said = new ArrayList<>();
    said.add(proved());
    contract().ifPresent(said::add);
    return List.of(String.join(" ", said));
  }

  private String proved() {
    int rows = answer.curve().rows().size();
    int unproved = answer.curve().unproved().size();
    String all = "of the " + rows + " finishes that were compared";
    String proof =
        unproved == 0
            ? ", and it is proved."
            : ". "
                + (rows - unproved)
                + " of these finishes are proved; the rest may be dearer than need be by at most"
                + " what Dayworth reports for them.";
    if (answer.isLeastTotal()) {
      int ties = answer.curve().least().size();
      return ties == 1
          ? "This is the least total " + all + proof
          : Words.capital(Words.number(ties)) + " " + all + " share the least total" + proof;
    }
    var least = answer.curve().leastTotal();
    BigDecimal above = answer.finish().total().subtract(least.total());
    return "The least total "
        + all
        + " is "
        + words.finish(least.duration())
        + "; this finish costs "
        + words.money(above)
        + " more in all. Its plan is the cheapest for its date, and that is proved.";
  }

  private Optional<String> contract() {
    var at = answer.curve().atContract();
    Optional<String> late = outcome.lateness(answer.finish(), words);
    if (late.isEmpty()) {
      return Optional.empty();
    }
    var due = outcome.contract().orElseThrow();
    if (at.isEmpty()) {
      return Optional.of(
          "The contract finish, " + words.due(due) + ", cannot be met by any plan of this case.");
    }
    long behind = answer.finish().duration() - due.ticks();
    if (behind == 0 || late.get().startsWith("on ")) {
      return Optional.of("It is the contract finish.");
    }
    String which = late.get().replace(" late", " after").replace(" early", " before");
    String start = "It is " + inWords(which) + " the contract finish";
    BigDecimal more = at.get().total().subtract(answer.finish().total());
    if (behind < 0) {
      return Optional.of(start + ".");
    }
    return Optional.of(
        start
            + ": making "
            + words.plainFinish(at.get().duration())
            + " is possible and costs "
            + (more.signum() >= 0
                ? words.money(more) + " more in all."
                : words.money(more.negate()) + " less in all."));
  }

  private static String inWords(String count) {
    String[] parts = count.split(" ", 2);
    return parts[0].matches("\\d{1,2}")
        ? Words.number(Integer.parseInt(parts[0])) + " " + parts[1]
        : count;
  }

  List<Document.Fact> facts() {
    List<Document.Fact> facts = new ArrayList<>();
    facts.add(fact("Prepared for", Words.safe(submission.preparedFor())));
    facts.add(fact("Prepared by", Words.safe(submission.preparedBy())));
    facts.add(
        fact("Basis", submission.basis().map(basis -> Words.capital(basis.word())).orElse("")));
    facts.add(
        fact(
            "Status at the end of",
            answer.of().progress().map(status -> Words.longDate(status.dataDate())).orElse("")));
    facts.add(fact("Contract finish", outcome.contract().map(words::due).orElse("")));
    facts.add(fact("Open until", submission.validUntil().map(Words::longDate).orElse("")));
    return facts;
  }

  private static Document.Fact fact(String name, String value) {
    return new Document.Fact(name, value.isEmpty() ? NOT_STATED : value, !value.isEmpty());
  }
}

package dayworth.report.brief;

import dayworth.contract.Extension;
import dayworth.decision.Basis;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Finish;
import dayworth.decision.Notes;
import dayworth.decision.Progress;
import dayworth.decision.Submission;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What is asked, on what basis, and from where the work is looked at. */
final class AskedSection {

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final Submission submission;

  AskedSection(BriefAnswer answer, Words words, Outcome outcome) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.submission = answer.of().submission();
  }

  Section section() {
    List<Part> main = new ArrayList<>(passages(submission.notes().asked()));
    main.add(new Part.Prose(paragraphs()));
    missing().ifPresent(main::add);
    Part.Remark remark = new Part.Remark("Status", List.of(new Part.Notes(List.of(status()))));
    return new Section("asked", "What is asked", List.of(new Part.Beside(main, remark)));
  }

  /** What people wrote, as it stands. */
  static List<Part> passages(List<Notes.Passage> passages) {
    List<Part> parts = new ArrayList<>();
    for (Notes.Passage passage : passages) {
      List<String> texts = passage.texts().stream().map(Words::safe).toList();
      parts.add(
          passage instanceof Notes.Items
              ? new Part.Statements(
                  texts.stream().map(text -> new Part.Statement(text, "")).toList())
              : new Part.Prose(texts));
    }
    return parts;
  }

  private List<String> paragraphs() {
    List<String> paragraphs = new ArrayList<>();
    paragraphs.add(putForward() + basis());
    remaining().ifPresent(paragraphs::add);
    paragraphs.add(extension());
    return paragraphs;
  }

  private String putForward() {
    long gained = outcome.gained();
    if (gained == 0) {
      return "It is put forward that the work goes on as planned and finishes "
          + words.onFinish(answer.finish().duration())
          + ".";
    }
    return "It is put forward that the work finishes "
        + words.onFinish(answer.finish().duration())
        + " instead of "
        + words.longFinish(outcome.planned().duration())
        + ", the finish that "
        + words.presentPlan()
        + " gives.";
  }

  private String basis() {
    return submission.basis().map(basis -> " " + said(basis)).orElse("");
  }

  private static String said(Basis basis) {
    return switch (basis) {
      case MITIGATION ->
          "The basis is mitigation: reasonable steps to make less of a delay. Who bears their cost"
              + " is for the contract to say.";
      case OWN_RECOVERY ->
          "The basis is own recovery: the contractor makes up time for its own reasons and on its"
              + " own account.";
      case AGREED ->
          "The basis is agreement: both sides agree to the earlier finish and to what is paid for"
              + " it.";
      case DIRECTED ->
          "The basis is a direction: the contractor has been told to finish earlier and states what"
              + " that costs.";
      case UNDER_PROTEST ->
          "The basis is acceleration under protest: the contractor goes ahead and reserves its"
              + " rights to time and money.";
    };
  }

  /** What is still to be paid, and what meeting the contract would take beyond that. */
  private Optional<String> remaining() {
    Finish chosen = answer.finish();
    List<String> said = new ArrayList<>();
    BigDecimal damages = Outcome.damages(chosen);
    if (damages.signum() > 0) {
      said.add("Damages of " + words.money(damages) + " remain payable at this finish.");
    }
    BigDecimal bonus = Outcome.bonus(chosen);
    if (bonus.signum() > 0) {
      said.add("A bonus of " + words.money(bonus) + " is earned at this finish.");
    }
    answer
        .curve()
        .atContract()
        .filter(at -> at.duration() < chosen.duration())
        .ifPresent(at -> said.add(contract(at, chosen)));
    return said.isEmpty() ? Optional.empty() : Optional.of(String.join(" ", said));
  }

  private String contract(Finish at, Finish chosen) {
    BigDecimal extra = outcome.extraDirect(at).subtract(outcome.extraDirect(chosen));
    BigDecimal more = at.total().subtract(chosen.total());
    BigDecimal saved = extra.subtract(more);
    return "Making "
        + words.finish(at.duration())
        + ", the contract finish, takes "
        + words.money(extra)
        + " of further direct cost and saves "
        + words.money(saved)
        + " of other cost and damages; the difference is "
        + words.money(more)
        + ".";
  }

  private String extension() {
    Optional<Extension> claimed = answer.of().terms().extension();
    return claimed
        .map(
            extension ->
                "An extension of time to "
                    + words.due(extension.due())
                    + " is claimed and has not been granted. Whether it is due is not judged"
                    + " here; the choices below are shown with it and without it.")
        .orElse("No extension of time is claimed in this paper, and none is given up.");
  }

  private String status() {
    int toGo = answer.of().toGo();
    Optional<Progress> progress = answer.of().progress();
    if (progress.isEmpty()) {
      return "The case has no data date: all "
          + toGo
          + " activities are looked at as not yet started and open to choice.";
    }
    return "At the end of "
        + Words.longDate(progress.get().dataDate())
        + " "
        + progress.get().finished()
        + " activities were finished and "
        + progress.get().inProgress()
        + " in progress. "
        + Words.capital(Words.number(toGo))
        + " are still to be done, wholly or in part; all figures are of the work to go, and money"
        + " already spent is left out.";
  }

  private Optional<Part> missing() {
    List<String> what = new ArrayList<>();
    List<String> terms = new ArrayList<>();
    missing(submission.basis().isEmpty(), "the basis", "basis", what, terms);
    missing(submission.preparedFor().isEmpty(), "whom it is for", "prepared_for", what, terms);
    missing(submission.preparedBy().isEmpty(), "who wrote it", "prepared_by", what, terms);
    missing(submission.reference().isEmpty(), "its reference", "reference", what, terms);
    missing(submission.validUntil().isEmpty(), "until when it is open", "valid_until", what, terms);
    List<String> how = new ArrayList<>();
    if (!terms.isEmpty()) {
      how.add("Add to terms.csv: " + Words.list(terms, 5) + ".");
    }
    if (submission.notes().asked().isEmpty()) {
      what.add("what is wanted of the reader");
      how.add("Say in notes.md, under the heading What is asked, what is wanted of the reader.");
    }
    return what.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new Part.Gap("Not in the case: " + Words.list(what, 6) + ".", String.join(" ", how)));
  }

  private static void missing(
      boolean isMissing, String name, String term, List<String> what, List<String> terms) {
    if (isMissing) {
      what.add(name);
      terms.add(term);
    }
  }
}

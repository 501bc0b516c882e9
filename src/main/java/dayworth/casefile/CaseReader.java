package dayworth.casefile;

import dayworth.buildup.BuildUp;
import dayworth.contract.MomentMoney;
import dayworth.decision.Case;
import dayworth.decision.InputFile;
import dayworth.decision.Notes;
import dayworth.decision.Progress;
import dayworth.decision.Submission;
import dayworth.decision.WorkToGo;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/** Reads a case folder: a sound case, or every problem in it. */
public final class CaseReader {

  private final Findings findings = new Findings();
  private final CaseFolder folder;
  private final String name;

  private CaseReader(Path path) {
    Path absolute = path.toAbsolutePath().normalize();
    name = String.valueOf(absolute.getFileName());
    folder = new CaseFolder(absolute, findings);
  }

  /**
   * Reads a folder.
   *
   * @param atLeast the time scale is at least as fine as this
   */
  public static Reading read(Path path, TimeScale atLeast) {
    return read(path, atLeast, Quantity.ONE);
  }

  /**
   * Reads a folder.
   *
   * @param atLeast the time scale is at least as fine as this
   * @param lossFactor what all losses of output are multiplied by; 0 or more
   */
  public static Reading read(Path path, TimeScale atLeast, Quantity lossFactor) {
    return new CaseReader(path).read(atLeast, lossFactor);
  }

  /** The files of the contract in a folder with their digests, sound or not. */
  public static List<InputFile> inputs(Path path) {
    return new CaseReader(path).folder.digests();
  }

  private Reading read(TimeScale atLeast, Quantity lossFactor) {
    folder.checkNames();
    Optional<String> activityText = folder.text(ActivityTable.FILE);
    Optional<String> holidayText = folder.text(HolidayTable.FILE);
    Optional<String> labourText = folder.text(LabourTable.FILE);
    Optional<String> linkText = folder.text(LinkTable.FILE);
    Optional<String> lossText = folder.text(LossTable.FILE);
    Optional<String> measureText = folder.text(MeasureTable.FILE);
    Optional<String> packageText = folder.text(PackageTable.FILE);
    Optional<String> patternText = folder.text(PatternTable.FILE);
    Optional<String> payText = folder.text(PayTable.FILE);
    Optional<String> progressText = folder.text(ProgressTable.FILE);
    Optional<String> runningText = folder.text(RunningTable.FILE);
    Optional<String> sectionText = folder.text(SectionTable.FILE);
    Optional<String> termText = folder.text(TermsTable.FILE);
    Optional<String> noteText = folder.textBeside(NotesText.FILE);
    TermsTable terms = TermsTable.read(termText, findings);
    LabourTable labour = LabourTable.of(labourText, findings);
    Optional<List<ActivityRow>> stated =
        activityText.flatMap(text -> ActivityTable.read(text, labour::mayGive, findings));
    ActivityIds ids = new ActivityIds(stated, findings);
    LabourFiles.Texts patternTexts = new LabourFiles.Texts(patternText, payText, lossText);
    LabourFiles files = LabourFiles.read(labour, ids, patternTexts, lossFactor, findings);
    CaseBuildUp built = CaseBuildUp.of(files, terms, findings);
    Optional<List<ActivityRow>> known = stated.map(built::filled);
    List<LinkRow> links = LinkTable.read(known, linkText, findings);
    List<LocalDate> holidays = HolidayTable.read(holidayText, findings);
    DateRules.check(known.orElse(List.of()), holidays, terms, findings);
    Notes notes = noteText.map(text -> NotesText.read(text, findings)).orElse(Notes.NONE);
    List<ProgressRow> progress = ProgressTable.read(known, progressText, findings);
    List<SectionRow> sections = SectionTable.read(ids, terms, sectionText, findings);
    List<RunningRow> running = RunningTable.read(ids, terms, runningText, findings);
    PackageTable packages = PackageTable.read(packageText, findings);
    List<MeasureRow> measures = MeasureTable.read(ids, packages, measureText, findings);
    packages.reportUnused(measures);
    ProgressDates.check(progress, folder.has(ProgressTable.FILE), terms, findings);
    if (findings.hasProblems()) {
      return new Reading.Unsound(findings.problems(), findings.warnings());
    }
    BuildUp buildUp = built.build(stated.orElseThrow(), known.orElseThrow(), progress, lossFactor);
    if (findings.hasProblems()) {
      return new Reading.Unsound(findings.problems(), findings.warnings());
    }
    Case read =
        build(
            known.orElseThrow(),
            links,
            terms,
            holidays,
            progress,
            sections,
            running,
            measures,
            packages,
            notes,
            buildUp,
            atLeast);
    if (findings.hasProblems()) {
      return new Reading.Unsound(findings.problems(), findings.warnings());
    }
    return new Reading.Sound(read);
  }

  private Case build(
      List<ActivityRow> activities,
      List<LinkRow> links,
      TermsTable terms,
      List<LocalDate> holidays,
      List<ProgressRow> rows,
      List<SectionRow> sections,
      List<RunningRow> running,
      List<MeasureRow> measures,
      PackageTable packages,
      Notes notes,
      BuildUp buildUp,
      TimeScale atLeast) {
    TimeScale scale =
        Resolution.of(activities, links, terms, rows, sections, measures)
            .and(CaseBuildUp.scale(buildUp))
            .and(atLeast);
    CaseCalendar times = CaseCalendar.of(terms, holidays, scale);
    Network planned =
        new Network(
            scale,
            activities.stream().map(row -> activity(row, times)).toList(),
            links.stream().map(row -> link(row, scale)).toList(),
            List.of(),
            CaseMeasures.of(measures, packages, buildUp, scale, findings));
    Optional<Progress> progress = CaseProgress.of(activities, rows, terms, times);
    WorkToGo work = WorkToGo.of(planned, progress);
    MomentMoney money = CaseMoney.of(sections, running, terms, times, progress);
    CaseSize.check(work.network(), money, terms, times, sections, findings);
    SectionDoubts.report(sections, running, rows, terms, times, planned, findings);
    MeasureDoubts.report(measures, rows, planned, findings);
    checkSomethingIsToGo(progress);
    Doubts.report(
        new ReadCase(
            work,
            activities,
            work.links().stream().map(links::get).toList(),
            links,
            rows,
            sections,
            terms,
            times.calendar()),
        findings);
    return new Case(
        name,
        terms.text("title").orElse(""),
        terms.text("currency").orElse(""),
        terms.unit(),
        work.network(),
        ContractTerms.of(terms, times),
        money,
        progress,
        buildUp,
        findings.warnings(),
        folder.inputs(),
        submission(terms, notes));
  }

  private static Submission submission(TermsTable terms, Notes notes) {
    return new Submission(
        terms.basis(),
        terms.text("prepared_for").orElse(""),
        terms.text("prepared_by").orElse(""),
        terms.text("reference").orElse(""),
        terms.validUntil(),
        terms.number("on_cost_percent"),
        terms.number("proposal_cost").map(Money::of),
        notes);
  }

  private void checkSomethingIsToGo(Optional<Progress> progress) {
    if (progress.filter(all -> all.finished() == all.statuses().size()).isPresent()) {
      String right = "work that is to go: of a finished project nothing can be changed";
      findings.problem(Place.whole(ProgressTable.FILE).notice("all is finished", "", right));
    }
  }

  private static Activity activity(ActivityRow row, CaseCalendar times) {
    TimeScale scale = times.scale();
    BigDecimal normal = row.normal().orElseThrow();
    Money cost = Money.of(row.normalCost().orElseThrow());
    return new Activity(
        row.id(),
        row.name(),
        row.group(),
        scale.ticks(normal),
        scale.ticks(row.crash().orElse(normal)),
        cost,
        row.crashCost().map(Money::of).orElse(cost),
        row.notBefore().map(times::start).orElse(0L),
        0,
        row.divisible());
  }

  private static Link link(LinkRow row, TimeScale scale) {
    return new Link(row.predecessor(), row.successor(), row.relation(), scale.ticks(row.lag()));
  }
}

package dayworth.report.brief;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.RunningCost;
import dayworth.contract.Section;
import dayworth.contract.Terms;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Case;
import dayworth.decision.Notes;
import dayworth.decision.Notice;
import dayworth.network.Link;
import dayworth.network.Relation;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Part.Statement;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/** What the answer rests on, what the client must do, and what must be heeded. */
final class RestsSection {

  private static final int MOST_LINKS = 5;
  private static final int MOST_WARNINGS = 8;

  private final Case of;
  private final Words words;

  RestsSection(BriefAnswer answer, Words words) {
    this.of = answer.of();
    this.words = words;
  }

  dayworth.report.brief.page.Section section() {
    List<Part> main = new ArrayList<>();
    main.add(new Part.Statements(statements()));
    if (!of.warnings().isEmpty()) {
      main.add(new Part.Subheading("Doubtful input"));
      main.add(new Part.Statements(warnings()));
    }
    main.add(new Part.Subheading("What we need"));
    if (of.submission().notes().needs().isEmpty()) {
      main.add(
          new Part.Gap(
              "Not in the case: what the client must do.",
              "Put approvals, access, permits and their dates into notes.md under the heading What"
                  + " we need."));
    } else {
      main.add(new Part.Statements(noted(of.submission().notes().needs())));
    }
    return new dayworth.report.brief.page.Section(
        "rests",
        "What this rests on",
        List.of(new Part.Beside(main, new Part.Remark("Cautions", cautions()))));
  }

  private static List<Statement> noted(List<Notes.Passage> passages) {
    return passages.stream()
        .flatMap(passage -> passage.texts().stream())
        .map(text -> new Statement(Words.safe(text), "notes.md"))
        .toList();
  }

  private boolean has(String file) {
    return of.inputs().stream().anyMatch(input -> input.name().equals(file));
  }

  private List<Statement> statements() {
    List<Statement> all = new ArrayList<>(noted(of.submission().notes().assumptions()));
    if (of.submission().notes().assumptions().isEmpty()) {
      all.add(
          new Statement(
              "No assumptions of its own are stated with this case; what follows is what its files"
                  + " say.",
              "notes.md, Assumptions: nothing there"));
    }
    all.add(calendar());
    all.addAll(shortening());
    all.addAll(lags());
    all.addAll(money());
    all.add(
        new Statement(
            "Crews, plant and suppliers are there when the plan needs them. The calculation does not"
                + " level resources.",
            "limit of the method"));
    all.add(
        new Statement(
            "Work is done without a break, and takes no longer than its normal duration.",
            "limit of the method"));
    return all;
  }

  private List<Statement> shortening() {
    List<Statement> all = new ArrayList<>();
    all.add(
        new Statement(
            "Between its normal and its crash duration "
                + (of.network().measures().isNone() ? "each" : "an")
                + " activity can be shortened bit by bit at an even price.",
            "activities.csv"));
    if (!of.network().measures().isNone()) {
      String files =
          Words.list(
              Stream.of("measures.csv", "labour.csv", "patterns.csv").filter(this::has).toList(),
              3);
      all.add(
          new Statement(
              "A measure is taken wholly or not at all, one at most for an activity, and the price"
                  + " of "
                  + words.aUnit()
                  + " by it is an average. A package is paid once, whatever uses it.",
              files));
    }
    if (!of.buildUp().lossFactor().equals(Quantity.ONE)) {
      all.add(
          new Statement(
              "All losses of output were multiplied by "
                  + Words.decimals(of.buildUp().lossFactor())
                  + " for this paper; curve.csv and its fellows keep to the case's own losses.",
              "output_loss.csv, --loss-factor"));
    }
    return all;
  }

  private Statement calendar() {
    if (words.calendar().isEmpty()) {
      return new Statement(
          "Time is counted in " + words.units() + " from the start. No dates are told.",
          "no start_date in terms.csv");
    }
    var dates = words.calendar().get();
    int holidays = dates.holidaysThatCount();
    String week =
        "A week has "
            + Words.count(dates.weekdays().size(), "working day", "working days")
            + ", "
            + weekdays(List.copyOf(dates.weekdays()))
            + ". ";
    String free =
        holidays == 0
            ? "No holidays are left out."
            : Words.capital(Words.count(holidays, "holiday is", "holidays are")) + " left out.";
    return new Statement(
        week + free,
        has("holidays.csv") ? "terms.csv, holidays.csv" : "terms.csv; no holidays.csv");
  }

  private static String weekdays(List<DayOfWeek> some) {
    List<DayOfWeek> days = some.stream().sorted().toList();
    int first = days.get(0).getValue();
    int last = days.get(days.size() - 1).getValue();
    boolean inOneRow = last - first + 1 == days.size() && days.size() > 2;
    return inOneRow
        ? name(days.get(0)) + " to " + name(days.get(days.size() - 1))
        : Words.list(days.stream().map(RestsSection::name).toList(), 7);
  }

  private static String name(DayOfWeek day) {
    return day.getDisplayName(TextStyle.FULL, Locale.ENGLISH);
  }

  /** The first links that are more than one thing after another. */
  private List<Statement> lags() {
    List<Link> told =
        of.network().links().stream()
            .filter(link -> link.relation() != Relation.FS || link.lag() != 0)
            .filter(link -> of.isToGo(link.predecessor()) && of.isToGo(link.successor()))
            .toList();
    if (told.isEmpty()) {
      return List.of();
    }
    List<String> said = told.stream().limit(MOST_LINKS).map(this::said).toList();
    int left = told.size() - said.size();
    String more =
        left > 0
            ? " " + Words.capital(Words.count(left, "more link", "more links")) + " of such kinds."
            : "";
    return List.of(new Statement(Words.capital(String.join("; ", said)) + "." + more, "links.csv"));
  }

  private String said(Link link) {
    String from = Words.id(of.network().activity(link.predecessor()));
    String to = Words.id(of.network().activity(link.successor()));
    boolean toStart = link.relation() == Relation.FS || link.relation() == Relation.SS;
    boolean fromStart = link.relation() == Relation.SS || link.relation() == Relation.SF;
    String what = toStart ? "starts" : "finishes";
    String event = from + (fromStart ? " starts" : " finishes");
    String when =
        link.lag() == 0
            ? "no earlier than "
            : link.lag() > 0
                ? "at least " + words.time(link.lag()) + " after "
                : "at the earliest " + words.time(-link.lag()) + " before ";
    return to + " " + what + " " + when + event;
  }

  private List<Statement> money() {
    List<Statement> all = new ArrayList<>();
    Terms terms = of.terms();
    if (!terms.timeRelated().rate().isZero()) {
      all.add(
          new Statement(
              "Time-related cost of "
                  + words.money(terms.timeRelated().rate())
                  + " "
                  + words.one(terms.timeRelated().per())
                  + " stops at the finish.",
              "terms.csv, time_related_cost"));
    }
    if (terms.contractFinish().isPresent() && !terms.damages().rate().isZero()) {
      all.add(
          new Statement(
              "Damages are " + said(terms.damages()) + " after the contract finish.",
              "terms.csv, damages_rate"));
    }
    if (terms.contractFinish().isPresent() && !terms.bonus().rate().isZero()) {
      all.add(
          new Statement(
              "A bonus of " + said(terms.bonus()) + " is paid before it.",
              "terms.csv, bonus_rate"));
    }
    for (RunningCost cost : of.momentMoney().running()) {
      all.add(
          new Statement(
              Words.capital(Words.safe(cost.name()))
                  + " costs "
                  + words.money(cost.rate())
                  + " "
                  + words.one(cost.per())
                  + " while it is there.",
              "running.csv"));
    }
    for (Section section : of.momentMoney().sections()) {
      all.add(
          new Statement(
              "Section "
                  + Words.safe(section.name())
                  + " is due "
                  + (words.hasDates() ? "on " : "at ")
                  + words.due(section.due())
                  + (section.damages().rate().isZero()
                      ? "."
                      : "; damages " + said(section.damages()) + "."),
              "sections.csv"));
    }
    return all;
  }

  private String said(Damages damages) {
    String grace =
        damages.grace().signum() == 0
            ? ""
            : ", the first "
                + Words.grouped(
                    damages.grace().stripTrailingZeros().scale() < 0
                        ? damages.grace().setScale(0)
                        : damages.grace())
                + " free";
    String cap = damages.cap().map(most -> ", at most " + words.money(most) + " in all").orElse("");
    return words.money(damages.rate()) + " " + words.one(damages.per()) + grace + cap;
  }

  private String said(Bonus bonus) {
    String cap = bonus.cap().map(most -> ", at most " + words.money(most)).orElse("");
    Optional<BigDecimal> count = bonus.capCount();
    String most = count.map(n -> ", for at most " + n.toPlainString() + " of them").orElse("");
    return words.money(bonus.rate()) + " " + words.one(bonus.per()) + cap + most;
  }

  private List<Statement> warnings() {
    List<Statement> all = new ArrayList<>();
    for (Notice warning : of.warnings()) {
      if (all.size() == MOST_WARNINGS) {
        int left = of.warnings().size() - MOST_WARNINGS;
        all.add(
            new Statement(
                Words.capital(Words.count(left, "more warning", "more warnings")) + ".",
                "result.json has them"));
        return all;
      }
      String found = warning.found().isEmpty() ? "" : ", found " + Words.safe(warning.found());
      all.add(
          new Statement(
              Words.capital(Words.safe(warning.wrong()))
                  + found
                  + ". "
                  + Words.capital(Words.safe(warning.right()))
                  + ".",
              Words.safe(warning.place())));
    }
    return all;
  }

  private List<Part> cautions() {
    return List.of(
        new Part.Caution(
            "Hours and fatigue.",
            "Shortening often means longer hours, more people or night work. Long hours raise the"
                + " risk of injury and lower output. Check every pattern against the working-time"
                + " rules and agreements that apply, with the competent person; this page calls no"
                + " pattern lawful or safe."),
        new Part.Caution(
            "Contract and law.",
            "Damages, bonus and entitlement depend on the contract and the law that governs it. This"
                + " is not legal advice: read the contract and take advice from a licensed"
                + " professional."),
        new Part.Caution(
            "Chance.",
            "Durations are single figures. The chance of making a date is not stated here; several"
                + " critical chains at once make it smaller."),
        new Part.Caution(
            "If there is no agreement.",
            "Whoever goes ahead without one should give the notices that the contract asks for, say"
                + " what is reserved, and keep records of hours, crews and output from the first"
                + " day."));
  }
}

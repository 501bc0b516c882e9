package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.report.ObstacleSentence;
import dayworth.report.brief.page.Document;
import dayworth.report.brief.page.HtmlPage;
import dayworth.report.brief.page.MarkdownPage;
import dayworth.report.brief.page.Section;
import dayworth.value.Quantity;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** The files of {@code dayworth brief}. */
public final class Brief {

  /** Every name that it may have. */
  public static final Set<String> NAMES = Set.of("brief.html", "brief.md");

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final List<Stretch> stretches;
  private final FinishTelling telling;
  private final NetworkLayout layout;

  Brief(BriefAnswer answer) {
    this.answer = answer;
    this.words = new Words(answer);
    this.outcome = new Outcome(answer);
    this.stretches = Stretch.of(answer);
    String shortest = ObstacleSentence.of(answer.of(), answer.curve().curve());
    this.telling = new FinishTelling(answer, words, outcome, stretches, shortest);
    this.layout = new NetworkLayout(answer, words);
  }

  /** The brief as a page that needs nothing else, by its name. */
  public static Map<String, byte[]> html(BriefAnswer answer) {
    return Map.of("brief.html", new Brief(answer).html().getBytes(StandardCharsets.UTF_8));
  }

  /** The same text for pasting. */
  public static Map<String, byte[]> markdown(BriefAnswer answer) {
    String text = MarkdownPage.of(new Brief(answer).document());
    return Map.of("brief.md", text.getBytes(StandardCharsets.UTF_8));
  }

  private String html() {
    FinishAxis axis = FinishAxis.broad(answer, words);
    FinishAxis narrow = FinishAxis.narrow(answer, words);
    ExplorerBar bar = new ExplorerBar(answer, words, telling);
    return HtmlPage.of(
        document(),
        new HtmlPage.Explorer(
            bar.html(),
            new ExplorerData(answer, words, telling, layout).json(),
            ExplorerBar.style(axis, narrow)));
  }

  /** The other files are written with the losses of the case itself. */
  private String closing() {
    return answer.of().buildUp().lossFactor().equals(Quantity.ONE)
        ? "Written by dayworth brief. The figures are those of curve.csv, steps.csv and plan.csv, to"
            + " the cent; dayworth verify checks them again."
        : "Written by dayworth brief with another loss of output than the case's own.";
  }

  Document document() {
    Numbering numbering = new Numbering();
    HeadOfBrief head = new HeadOfBrief(answer, words, outcome);
    CurveSections curve = new CurveSections(answer, words, outcome, stretches, numbering);
    FinishSections finish = new FinishSections(answer, words, telling, layout, numbering);
    List<Section> sections = new ArrayList<>();
    sections.add(new AskedSection(answer, words, outcome).section());
    sections.add(curve.curve());
    sections.add(curve.price());
    sections.add(curve.map());
    sections.add(finish.finish());
    sections.add(finish.network());
    sections.add(new ChoicesSection(answer, words, outcome, numbering).section());
    sections.add(new BoughtSection(answer, words, outcome, stretches, numbering).section());
    sections.add(new RestsSection(answer, words).section());
    sections.add(new ProofSection(answer, words, outcome, stretches, numbering).section());
    return new Document(
        words.project() + ": what an earlier finish costs, and what it is worth",
        Words.safe(answer.of().submission().reference()),
        head.headline(),
        head.sum(),
        head.lede(),
        head.facts(),
        sections,
        closing());
  }
}

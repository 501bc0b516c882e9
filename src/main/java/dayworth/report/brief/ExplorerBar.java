package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.report.brief.page.Escape;
import java.util.Locale;

/** The slider that stands on the axis of the pictures above it, with its buttons. */
final class ExplorerBar {

  /** Half of the slider's thumb, pixels. */
  private static final int THUMB = 12;

  private final BriefAnswer answer;
  private final Words words;
  private final FinishTelling telling;

  ExplorerBar(BriefAnswer answer, Words words, FinishTelling telling) {
    this.answer = answer;
    this.words = words;
    this.telling = telling;
  }

  String html() {
    int chosen = answer.chosenState();
    long finish = answer.finish().duration();
    long longest = answer.states().get(0).finish().duration();
    long shortest = answer.states().get(answer.states().size() - 1).finish().duration();
    return "<div class=\"bar js-only\" role=\"group\" aria-label=\"Choose a finish\">"
        + "<output class=\"now\" for=\"finish\"><b id=\"now-d\">"
        + Escape.html(words.time(finish))
        + "</b> <span id=\"now-f\">"
        + Escape.html(words.date(finish).map(words::shortDate).orElse(""))
        + "</span></output>\n<input type=\"range\" id=\"finish\" min=\"0\" max=\""
        + (longest - shortest)
        + "\" step=\"1\" value=\""
        + (longest - finish)
        + "\" aria-label=\"Finish, from longest to shortest\" aria-valuetext=\""
        + Escape.html(telling.spoken(chosen))
        + "\">\n<div class=\"steps\"><button type=\"button\" id=\"later\" aria-label=\"A later"
        + " finish\">later</button><button type=\"button\" id=\"sooner\" aria-label=\"A sooner"
        + " finish\">sooner</button></div></div>";
  }

  /** Where the slider lies: on the axis of the pictures, at both widths. */
  static String style(FinishAxis broad, FinishAxis narrow) {
    return ".bar input{"
        + place(broad)
        + "}@media (max-width:640px){.bar input{"
        + place(narrow)
        + "}}";
  }

  private static String place(FinishAxis axis) {
    double from = axis.x(axis.longest()) * 100 / axis.width();
    double to = axis.x(axis.shortest()) * 100 / axis.width();
    return String.format(
        Locale.ROOT,
        "left:calc(%.3f%% - %dpx);width:calc(%.3f%% + %dpx)",
        from,
        THUMB,
        to - from,
        2 * THUMB);
  }
}

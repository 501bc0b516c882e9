package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** One finish: its money, what is shortened for it, and the network then. */
final class FinishSections {

  private final BriefAnswer answer;
  private final Words words;
  private final FinishTelling telling;
  private final NetworkLayout layout;
  private final Numbering numbering;

  FinishSections(
      BriefAnswer answer,
      Words words,
      FinishTelling telling,
      NetworkLayout layout,
      Numbering numbering) {
    this.answer = answer;
    this.words = words;
    this.telling = telling;
    this.layout = layout;
    this.numbering = numbering;
  }

  /** What the slider changes. */
  Section finish() {
    int chosen = answer.chosenState();
    List<Part.Pick> picks =
        telling.picks(chosen).stream()
            .map(
                pick ->
                    new Part.Pick(
                        words.id(pick.activity()),
                        Words.name(answer.of().network().activity(pick.activity())),
                        pick.tally(),
                        pick.price()))
            .toList();
    Part readout = new Part.Readout(telling.lines(chosen), picks, telling.rest(chosen), jumps());
    return new Section(
        "finish",
        telling.heading(chosen),
        List.of(
            new Part.Beside(
                List.of(readout),
                new Part.Remark(
                    "Note on this finish", List.of(new Part.Live("say", telling.say(chosen)))))),
        Section.Layout.EXPLORER);
  }

  private List<Part.Jump> jumps() {
    Map<Long, String> names = new LinkedHashMap<>();
    names.put(
        answer.curve().asPlanned().duration(),
        words.asPlanned().toLowerCase(java.util.Locale.ROOT));
    names.put(answer.curve().leastTotal().duration(), "least total");
    answer
        .curve()
        .atContract()
        .ifPresent(finish -> names.putIfAbsent(finish.duration(), "contract finish"));
    names.putIfAbsent(answer.curve().shortest().duration(), "shortest");
    names.putIfAbsent(answer.finish().duration(), "put forward");
    List<Part.Jump> jumps = new ArrayList<>();
    names.forEach(
        (finish, name) -> {
          if (answer.states().stream().anyMatch(s -> s.finish().duration() == finish)) {
            jumps.add(new Part.Jump(name, "finish=" + answer.of().network().scale().text(finish)));
          }
        });
    return jumps;
  }

  Section network() {
    String name = numbering.figure();
    NetworkPicture picture = new NetworkPicture(answer, words, layout);
    BriefAnswer.State chosen = answer.states().get(answer.chosenState());
    String chains = FinishTelling.chainCount(chosen.chainCount());
    boolean one = chosen.chainCount().equals(BigInteger.ONE);
    String heading =
        "The work at "
            + words.time(answer.finish().duration())
            + ": "
            + chains
            + (one ? " holds the finish" : " reach the finish together");
    return new Section(
        "network",
        heading,
        List.of(
            new Part.Figure(picture.picture(name)),
            new Part.Remark(
                "Note on " + name.toLowerCase(java.util.Locale.ROOT),
                List.of(picture.key(), new Part.Notes(notes(chosen, one))))),
        Section.Layout.BROAD);
  }

  private List<String> notes(BriefAnswer.State chosen, boolean one) {
    List<String> notes = new ArrayList<>();
    notes.add(
        "Upper corners of a box: early start and finish; lower corners: late start and finish;"
            + " between the lower ones its float, all in "
            + words.workingUnits()
            + ".");
    int critical = chosen.critical();
    int toGo = answer.of().toGo();
    notes.add(
        critical
            + " of "
            + toGo
            + " activities are critical."
            + (one
                ? ""
                : " Several chains end together, so the chance that all of them keep to time is"
                    + " lower than for one."));
    int left = layout.rest().values().stream().mapToInt(List::size).sum();
    if (left > 0) {
      boolean alsoCritical =
          layout.rest().values().stream()
              .flatMap(List::stream)
              .anyMatch(i -> answer.of().isCritical(chosen.timing(), i));
      notes.add(
          alsoCritical
              ? "More work is critical than there is room for; "
                  + left
                  + " activities are counted below by their group, some of them critical too."
              : "Boxes show the critical and the nearly critical work; "
                  + left
                  + " activities with more float are counted below, by their group.");
    }
    int done = answer.of().network().size() - toGo;
    if (done > 0) {
      notes.add(
          Words.capital(Words.count(done, "finished activity is", "finished activities are"))
              + " not shown.");
    }
    return notes;
  }
}

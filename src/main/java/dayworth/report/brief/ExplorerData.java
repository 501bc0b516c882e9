package dayworth.report.brief;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import dayworth.decision.BriefAnswer;
import dayworth.network.Link;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.svg.Face;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Map;
import java.util.function.IntToLongFunction;

/**
 * What the slider of the page tells of every finish, as JSON that can stand in a script element:
 * neither an end tag nor a comment nor a line break of JavaScript can be read out of it, whatever a
 * case says.
 */
final class ExplorerData {

  private final BriefAnswer answer;
  private final Words words;
  private final FinishTelling telling;
  private final NetworkLayout layout;
  private final NetworkPicture picture;
  private final FinishAxis axis;

  ExplorerData(BriefAnswer answer, Words words, FinishTelling telling, NetworkLayout layout) {
    this.answer = answer;
    this.words = words;
    this.telling = telling;
    this.layout = layout;
    this.picture = new NetworkPicture(answer, words, layout);
    this.axis = FinishAxis.broad(answer, words);
  }

  String json() {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
      json.writeStartObject();
      json.writeNumberField("chosen", answer.chosenState());
      json.writeNumberField("perUnit", words.ticksPerUnit());
      names(json);
      net(json);
      json.writeArrayFieldStart("states");
      for (int s = 0; s < answer.states().size(); s++) {
        state(json, s);
      }
      json.writeEndArray();
      json.writeEndObject();
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return inScript(text.toString());
  }

  /** What could end a script element or a line of script is written as its number. */
  static String inScript(String json) {
    StringBuilder safe = new StringBuilder(json.length() + 64);
    json.chars()
        .forEach(
            c -> {
              boolean risky =
                  c == '<' || c == '>' || c == '&' || c == 0x2028 || c == 0x2029 || c == 0x7F;
              if (risky) {
                safe.append(String.format("\\u%04x", c));
              } else {
                safe.append((char) c);
              }
            });
    return safe.toString();
  }

  private void names(JsonGenerator json) throws IOException {
    json.writeArrayFieldStart("acts");
    for (int i = 0; i < answer.of().network().size(); i++) {
      json.writeStartArray();
      json.writeString(words.id(i));
      json.writeString(Words.name(answer.of().network().activity(i)));
      json.writeEndArray();
    }
    json.writeEndArray();
  }

  private void net(JsonGenerator json) throws IOException {
    json.writeObjectFieldStart("net");
    json.writeNumberField("perTick", layout.perTick());
    json.writeNumberField("left", layout.left());
    json.writeNumberField("digit", Face.MEDIUM.width("0", 1));
    json.writeNumberField("width", layout.width());
    json.writeNumberField("height", layout.height());
    json.writeNumberField("bottom", layout.bottom());
    json.writeArrayFieldStart("boxes");
    for (int b = 0; b < layout.shown().size(); b++) {
      json.writeStartArray();
      json.writeNumber(layout.shown().get(b));
      json.writeNumber(layout.lane(b));
      json.writeNumber(layout.least(b));
      json.writeNumber(layout.activity(b).normal());
      json.writeString(Words.shortId(layout.activity(b)));
      json.writeEndArray();
    }
    json.writeEndArray();
    json.writeArrayFieldStart("links");
    for (Link link : layout.links()) {
      json.writeStartArray();
      json.writeNumber(layout.box(link.predecessor()));
      json.writeNumber(layout.box(link.successor()));
      json.writeString(link.relation().name());
      json.writeNumber(link.lag());
      json.writeString(picture.lagLabel(link));
      json.writeEndArray();
    }
    json.writeEndArray();
    json.writeArrayFieldStart("ticks");
    for (long tick : picture.ticks()) {
      json.writeStartArray();
      json.writeNumber(tick);
      json.writeString(picture.tickDate(tick));
      json.writeEndArray();
    }
    json.writeEndArray();
    json.writeNumberField(
        "due", answer.of().terms().contractFinish().map(due -> due.ticks()).orElse(-1L));
    json.writeStringField("dueLabel", picture.contractLabel());
    json.writeArrayFieldStart("rest");
    for (Map.Entry<String, List<Integer>> group : layout.rest().entrySet()) {
      json.writeString(NetworkPicture.restLabel(group.getKey(), group.getValue().size()));
    }
    json.writeEndArray();
    json.writeEndObject();
  }

  private void state(JsonGenerator json, int s) throws IOException {
    BriefAnswer.State state = answer.states().get(s);
    long finish = state.finish().duration();
    json.writeStartObject();
    json.writeStringField("t", answer.of().network().scale().text(finish));
    json.writeNumberField("f", Math.round(axis.share(finish) * 1e6) / 1e6);
    json.writeStringField("now", words.time(finish));
    json.writeStringField("on", words.date(finish).map(words::shortDate).orElse(""));
    json.writeStringField("head", telling.heading(s));
    json.writeStringField("aria", telling.spoken(s));
    json.writeStringField("say", telling.say(s));
    json.writeStringField("fin", picture.finishLabel(finish));
    json.writeArrayFieldStart("money");
    for (Part.Amount amount : telling.lines(s)) {
      json.writeString(amount.amount());
    }
    json.writeEndArray();
    picks(json, telling.picks(s));
    json.writeStringField("rest", telling.rest(s));
    frame(json, layout.frame(s), state);
    json.writeEndObject();
  }

  private void picks(JsonGenerator json, List<FinishTelling.Pick> picks) throws IOException {
    json.writeArrayFieldStart("picks");
    for (FinishTelling.Pick pick : picks) {
      json.writeStartArray();
      json.writeNumber(pick.activity());
      json.writeNumber(pick.tally().marks());
      json.writeNumber(pick.tally().isBack() ? 1 : 0);
      json.writeString(pick.tally().words());
      json.writeString(pick.price());
      json.writeEndArray();
    }
    json.writeEndArray();
  }

  private void frame(JsonGenerator json, NetworkFrame frame, BriefAnswer.State state)
      throws IOException {
    array(json, "s", frame, frame::start);
    array(json, "e", frame, frame::early);
    array(json, "l", frame, frame::late);
    array(json, "d", frame, frame::duration);
    json.writeNumberField("end", frame.finish());
    if (!layout.rest().isEmpty()) {
      json.writeArrayFieldStart("r");
      for (List<Integer> some : layout.rest().values()) {
        NetworkPicture.RestSpan span = NetworkPicture.RestSpan.of(state.timing(), some);
        json.writeStartArray();
        json.writeNumber(span.from());
        json.writeNumber(span.to());
        json.writeString(picture.floats(span));
        json.writeEndArray();
      }
      json.writeEndArray();
    }
  }

  private static void array(
      JsonGenerator json, String name, NetworkFrame frame, IntToLongFunction time)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (int b = 0; b < frame.boxes(); b++) {
      json.writeNumber(time.applyAsLong(b));
    }
    json.writeEndArray();
  }
}

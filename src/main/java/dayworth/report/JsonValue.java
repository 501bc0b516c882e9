package dayworth.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadFeature;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** JSON as values; numbers exact. */
sealed interface JsonValue {

  /** Members by name, in the order of the text. */
  record Members(Map<String, JsonValue> byName) implements JsonValue {}

  record Items(List<JsonValue> all) implements JsonValue {}

  /**
   * A number.
   *
   * @param written its digits as they stand in the text
   */
  record Numeral(BigDecimal value, String written) implements JsonValue {}

  /** A text, a truth value or null, as it is written. */
  record Word(JsonToken kind, String text) implements JsonValue {}

  /**
   * Reads a text of one value; no member may stand twice.
   *
   * @throws IOException if it is no JSON, with a message for people
   */
  static JsonValue read(byte[] bytes) throws IOException {
    JsonFactory factory =
        JsonFactory.builder().enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION).build();
    try (JsonParser parser = factory.createParser(bytes)) {
      if (parser.nextToken() == null) {
        throw new IOException("it is empty");
      }
      JsonValue value = value(parser);
      if (parser.nextToken() != null) {
        throw new IOException("something follows its end");
      }
      return value;
    }
  }

  private static JsonValue value(JsonParser parser) throws IOException {
    JsonToken token = parser.currentToken();
    switch (token) {
      case START_OBJECT -> {
        Map<String, JsonValue> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
          String name = parser.currentName();
          parser.nextToken();
          members.put(name, value(parser));
        }
        return new Members(members);
      }
      case START_ARRAY -> {
        List<JsonValue> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
          items.add(value(parser));
        }
        return new Items(items);
      }
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> {
        return new Numeral(parser.getDecimalValue(), parser.getText());
      }
      default -> {
        return new Word(token, parser.getText());
      }
    }
  }

  /** What stands here, for a message. */
  default String shown() {
    if (this instanceof Members) {
      return "members";
    }
    if (this instanceof Items items) {
      return items.all().size() + " items";
    }
    return this instanceof Numeral number ? number.written() : ((Word) this).text();
  }
}

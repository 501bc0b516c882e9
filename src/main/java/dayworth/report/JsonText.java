package dayworth.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigDecimal;

/** Writes JSON text: members in the order they are given, numbers plain and exact. */
final class JsonText {

  /** What stands between the braces of an object or the brackets of an array. */
  @FunctionalInterface
  interface Body {
    void write(JsonText json) throws IOException;
  }

  private final JsonGenerator generator;

  private JsonText(JsonGenerator generator) {
    this.generator = generator;
  }

  /** One object as text, ending with a line feed. */
  static String object(Body body) {
    StringWriter text = new StringWriter();
    JsonFactory factory =
        JsonFactory.builder().enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN).build();
    DefaultIndenter lines = new DefaultIndenter("  ", "\n");
    try (JsonGenerator generator = factory.createGenerator(text)) {
      generator.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(lines));
      generator.writeStartObject();
      body.write(new JsonText(generator));
      generator.writeEndObject();
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return text.append('\n').toString();
  }

  void text(String name, String value) throws IOException {
    generator.writeStringField(name, value);
  }

  void number(String name, BigDecimal value) throws IOException {
    generator.writeNumberField(name, value);
  }

  void number(String name, int value) throws IOException {
    generator.writeNumberField(name, value);
  }

  void yesNo(String name, boolean value) throws IOException {
    generator.writeBooleanField(name, value);
  }

  void nothing(String name) throws IOException {
    generator.writeNullField(name);
  }

  void object(String name, Body body) throws IOException {
    generator.writeObjectFieldStart(name);
    body.write(this);
    generator.writeEndObject();
  }

  /** An array of objects, one for each item. */
  <T> void array(String name, Iterable<T> items, ItemBody<T> body) throws IOException {
    generator.writeArrayFieldStart(name);
    for (T item : items) {
      generator.writeStartObject();
      body.write(this, item);
      generator.writeEndObject();
    }
    generator.writeEndArray();
  }

  /** An array of texts. */
  void texts(String name, Iterable<String> items) throws IOException {
    generator.writeArrayFieldStart(name);
    for (String item : items) {
      generator.writeString(item);
    }
    generator.writeEndArray();
  }

  /** The members of one object of an array. */
  @FunctionalInterface
  interface ItemBody<T> {
    void write(JsonText json, T item) throws IOException;
  }
}

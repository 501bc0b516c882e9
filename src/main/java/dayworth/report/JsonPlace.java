package dayworth.report;

import com.fasterxml.jackson.core.JsonToken;
import dayworth.decision.ClaimRefuted;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A value with the place where it stands; what is missing or of another kind is refused by name.
 */
record JsonPlace(String place, JsonValue value) {

  /** Longer than any project, and so far from the largest long that sums cannot overflow. */
  private static final BigDecimal MOST_TICKS = new BigDecimal("1e12");

  /** Beyond any amount; sums of numbers with a long exponent would never end. */
  private static final BigDecimal MOST = new BigDecimal("1e40");

  private static final int MOST_DECIMALS = 60;

  boolean isNothing() {
    return value instanceof JsonValue.Word word && word.kind() == JsonToken.VALUE_NULL;
  }

  Optional<JsonPlace> find(String name) throws ClaimRefuted {
    return Optional.ofNullable(members().get(name)).map(found -> new JsonPlace(at(name), found));
  }

  JsonPlace get(String name) throws ClaimRefuted {
    return find(name).orElseThrow(() -> new ClaimRefuted(at(name), "nothing", "this member"));
  }

  Map<String, JsonValue> members() throws ClaimRefuted {
    if (value instanceof JsonValue.Members members) {
      return members.byName();
    }
    throw wrong("an object");
  }

  List<JsonPlace> items() throws ClaimRefuted {
    if (!(value instanceof JsonValue.Items items)) {
      throw wrong("an array");
    }
    List<JsonPlace> places = new ArrayList<>();
    for (int i = 0; i < items.all().size(); i++) {
      places.add(new JsonPlace(place + "[" + i + "]", items.all().get(i)));
    }
    return places;
  }

  String text() throws ClaimRefuted {
    if (value instanceof JsonValue.Word word && word.kind() == JsonToken.VALUE_STRING) {
      return word.text();
    }
    throw wrong("a text");
  }

  boolean isYes() throws ClaimRefuted {
    if (value instanceof JsonValue.Word word
        && (word.kind() == JsonToken.VALUE_TRUE || word.kind() == JsonToken.VALUE_FALSE)) {
      return word.kind() == JsonToken.VALUE_TRUE;
    }
    throw wrong("true or false");
  }

  BigDecimal number() throws ClaimRefuted {
    if (!(value instanceof JsonValue.Numeral number)) {
      throw wrong("a number");
    }
    if (number.value().abs().compareTo(MOST) > 0 || number.value().scale() > MOST_DECIMALS) {
      throw wrong("a number that a result can hold");
    }
    return number.value();
  }

  /** A whole number within a long. */
  long whole() throws ClaimRefuted {
    try {
      return number().longValueExact();
    } catch (ArithmeticException notWhole) {
      throw wrong("a whole number");
    }
  }

  long ticks(TimeScale scale) throws ClaimRefuted {
    if (number().abs().compareTo(MOST_TICKS) > 0) {
      throw wrong("a time of the project");
    }
    try {
      return scale.ticks(number());
    } catch (ArithmeticException tooFine) {
      throw wrong("at most " + scale.decimals() + " decimals");
    }
  }

  ClaimRefuted wrong(String right) {
    return new ClaimRefuted(place, value.shown(), right);
  }

  private String at(String name) {
    return place.isEmpty() ? name : place + "." + name;
  }
}

package dayworth.report;

import dayworth.decision.Fault;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Where a result differs from what it ought to tell; numbers are compared by their value. */
final class ResultComparison {

  private static final String NOTHING = "nothing";

  private final Set<String> leftOut;
  private final List<Fault> faults = new ArrayList<>();

  private ResultComparison(Set<String> leftOut) {
    this.leftOut = leftOut;
  }

  /**
   * Every difference, in the order of the result.
   *
   * @param leftOut places that are not compared
   */
  static List<Fault> of(JsonValue found, JsonValue right, Set<String> leftOut) {
    ResultComparison comparison = new ResultComparison(leftOut);
    comparison.compare("", found, right);
    return comparison.faults;
  }

  /** The same for a part that stands at a place. */
  static List<Fault> ofPart(JsonPlace found, JsonValue right) {
    ResultComparison comparison = new ResultComparison(Set.of());
    comparison.compare(found.place(), found.value(), right);
    return comparison.faults;
  }

  private void compare(String place, JsonValue found, JsonValue right) {
    if (leftOut.contains(place)) {
      return;
    }
    if (found instanceof JsonValue.Members some && right instanceof JsonValue.Members others) {
      members(place, some, others);
    } else if (found instanceof JsonValue.Items some && right instanceof JsonValue.Items others) {
      items(place, some.all(), others.all());
    } else if (!same(found, right)) {
      faults.add(new Fault(place, found.shown(), right.shown()));
    }
  }

  private void members(String place, JsonValue.Members found, JsonValue.Members right) {
    Set<String> names = new LinkedHashSet<>(right.byName().keySet());
    names.addAll(found.byName().keySet());
    for (String name : names) {
      String member = place.isEmpty() ? name : place + "." + name;
      JsonValue one = found.byName().get(name);
      JsonValue other = right.byName().get(name);
      if (one == null) {
        faults.add(new Fault(member, NOTHING, other.shown()));
      } else if (other == null) {
        faults.add(new Fault(member, one.shown(), NOTHING));
      } else {
        compare(member, one, other);
      }
    }
  }

  private void items(String place, List<JsonValue> found, List<JsonValue> right) {
    for (int i = 0; i < Math.min(found.size(), right.size()); i++) {
      compare(place + "[" + i + "]", found.get(i), right.get(i));
    }
    if (found.size() != right.size()) {
      faults.add(new Fault(place, found.size() + " items", String.valueOf(right.size())));
    }
  }

  private static boolean same(JsonValue found, JsonValue right) {
    if (found instanceof JsonValue.Numeral one && right instanceof JsonValue.Numeral other) {
      return one.value().compareTo(other.value()) == 0;
    }
    return found.equals(right);
  }
}

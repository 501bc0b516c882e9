package dayworth.buildup;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.testing.Patterns;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;

/** Which patterns ask for care; the limits are those of the published findings. */
class CautionTest {

  private static final Pattern NORMAL = Patterns.plain("normal", 40, 5);

  private static List<Caution> of(int hours, int days, int weeks) {
    return Caution.of(Patterns.plain("bought", hours, days), NORMAL, Quantity.of(weeks));
  }

  @Test
  void fortyEightHoursAreNotMoreThanFortyEight() {
    assertEquals(List.of(), of(48, 6, 4));
    assertEquals(List.of(Caution.LONG_WEEK), of(49, 6, 4));
  }

  @Test
  void sixtyHoursAreFlaggedTwice() {
    assertEquals(List.of(Caution.LONG_WEEK), of(59, 6, 4));
    assertEquals(List.of(Caution.LONG_WEEK, Caution.VERY_LONG_WEEK), of(60, 6, 4));
  }

  @Test
  void twelveHourDaysAreFlagged() {
    assertEquals(List.of(), of(44, 4, 4));
    assertEquals(List.of(Caution.LONG_DAYS), of(48, 4, 4));
  }

  @Test
  void aWeekWithoutADayOfRestIsFlagged() {
    assertEquals(List.of(Caution.NO_REST_DAY), of(42, 7, 4));
  }

  @Test
  void onlyLongSpellsOfLongerHoursAreFlagged() {
    assertEquals(List.of(Caution.LONG_SPELL), of(45, 5, 5));
    assertEquals(List.of(), of(40, 5, 5));
  }

  @Test
  void aBiggerCrewMayWorkLate() {
    Pattern shifts =
        new Pattern(
            "shifts",
            Quantity.of(40),
            Quantity.of(5),
            Quantity.of(2),
            Quantity.ZERO,
            Money.ZERO,
            Money.ZERO,
            OptionalInt.empty(),
            "",
            PayLadder.STRAIGHT,
            OutputLoss.NONE);
    assertEquals(List.of(Caution.LATE_SHIFT), Caution.of(shifts, NORMAL, Quantity.of(9)));
  }
}

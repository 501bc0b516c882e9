package dayworth.contract;

/** What a rate of money is for one of. */
public enum Per {
  /** One time unit of the case. */
  UNIT,
  /** One day of the calendar, worked or not. */
  CALENDAR_DAY,
  /** Seven days of the calendar. */
  WEEK;

  /** Whether money at this rate hangs on the date of the finish, not on its tick. */
  public boolean isByDate() {
    return this != UNIT;
  }
}

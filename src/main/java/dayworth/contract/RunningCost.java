package dayworth.contract;

import dayworth.network.Moment;
import dayworth.value.Money;

/**
 * Money that runs from one moment to another, such as the hire of a crane.
 *
 * @param name for people
 * @param from usually the start of an activity; the project's start where it runs already
 * @param to usually the finish of an activity
 * @param rate money for one of {@code per}
 * @param per for calendar days both end days count; a begun week is a whole one
 */
public record RunningCost(String name, Moment from, Moment to, Money rate, Per per) {}

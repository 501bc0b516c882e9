/**
 * What time is worth: time-related and fixed cost, damages and bonus as functions of the finish.
 *
 * <p>A finish is a tick; where money goes by the date, the calendar turns it into one first. Every
 * amount is exact. What the plan costs, and which finish is best, is asked elsewhere.
 */
package dayworth.contract;

/**
 * The numbers everything else is made of: exact money, time in ticks, working days and dates,
 * slopes on a common scale.
 *
 * <p>Nothing here knows what an activity is, and nothing here rounds except where a method says so.
 */
package dayworth.value;

package dayworth.contract;

import dayworth.value.DayLength;

/**
 * More time under the contract that is claimed but not granted.
 *
 * @param due the contract finish if it were granted
 * @param day how long a working day is: extensions are counted in them
 */
public record Extension(Due due, DayLength day) {}

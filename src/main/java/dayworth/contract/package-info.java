/**
 * What time is worth: time-related and fixed cost, damages and bonus as functions of the finish.
 */
package dayworth.contract;

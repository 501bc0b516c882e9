/**
 * The build-up: what overtime, shifts and bigger crews buy, as a sum that can be followed line by
 * line. From labour hours, a crew, its pay and a working pattern follow the duration and the cost
 * of an activity that is done for some weeks at that pattern and then at the normal one.
 *
 * <p>No figure for pay or lost output is built in: all of them come from the case. Nothing here
 * knows of files, networks or the curve.
 */
package dayworth.buildup;

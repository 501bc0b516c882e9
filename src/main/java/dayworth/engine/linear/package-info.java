/**
 * Way 2: the cost at one deadline by linear programming with ojAlgo, written from the activities
 * and links.
 */
package dayworth.engine.linear;

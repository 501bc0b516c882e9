/**
 * Money that hangs on single moments and is not convex in them: staircases of calendar days, grace,
 * caps, whole weeks. Solved exactly by branching on when the moments come, each branch being a
 * convex problem for {@code dayworth.engine.stepping}. What the money is for is decided elsewhere.
 */
package dayworth.engine.branching;

/**
 * Ways to do activities that are taken wholly or not at all: the lower hulls that bound them, and
 * the search for the cheapest choice, which the stepping solves node by node. What is proved of a
 * choice is counted in {@code dayworth.engine.proof}; money that is not convex in time, and
 * packages, are branched on in {@code dayworth.engine.branching}.
 */
package dayworth.engine.measures;

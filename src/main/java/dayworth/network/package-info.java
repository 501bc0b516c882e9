/**
 * Activities, links and the network they make; its forward and backward pass, floats and chains.
 *
 * <p>Durations are chosen elsewhere: here a plan is given and its times follow. No money but the
 * direct cost of a plan.
 */
package dayworth.network;

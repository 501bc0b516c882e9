/** Way 1: the curve by marginal-cost stepping: maximum flows, minimum cuts, whole numbers only. */
package dayworth.engine.stepping;

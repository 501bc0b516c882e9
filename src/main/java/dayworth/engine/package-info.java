/**
 * What the project's cost is as a function of its duration: the records that the two ways and the
 * checker exchange. The ways themselves are in the packages below, each independent of the others.
 */
package dayworth.engine;

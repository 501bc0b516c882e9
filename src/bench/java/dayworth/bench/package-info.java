/**
 * Large networks and how long the engine takes over them; built by the Maven profile {@code bench}
 * only. Nothing here is part of the program or of its tests.
 */
package dayworth.bench;

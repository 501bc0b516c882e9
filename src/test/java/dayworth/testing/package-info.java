/** What tests of several packages share: random networks and an outside solver. */
package dayworth.testing;

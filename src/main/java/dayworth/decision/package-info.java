/** Questions put to the curve and their answers as values, and the case they are asked about. */
package dayworth.decision;

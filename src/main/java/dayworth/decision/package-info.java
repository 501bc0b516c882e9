/**
 * Questions put to the curve and their answers as values, and the case they are asked about: how
 * far it is and what of it is to go.
 */
package dayworth.decision;

/**
 * The pictures of an answer, as PNG and SVG: the curve, the price of each unit and the compression
 * map. What a picture shows is decided here and in no other place; what the figures are is not.
 */
package dayworth.report.picture;

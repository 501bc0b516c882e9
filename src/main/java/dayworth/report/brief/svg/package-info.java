/**
 * Lines, boxes and real words as SVG. It knows the widths of the page's label face, so that labels
 * have room before a browser has seen them.
 */
package dayworth.report.brief.svg;

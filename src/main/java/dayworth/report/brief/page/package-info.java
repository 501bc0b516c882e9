/**
 * A document as a value, sections of findings with sentences, tables and pictures, and its two
 * renderings, HTML and Markdown, which carry the same text. It knows nothing of cases.
 */
package dayworth.report.brief.page;

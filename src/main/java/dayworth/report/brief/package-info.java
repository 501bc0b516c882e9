/**
 * The brief: a paper that puts a plan before a client, written from an answer. What is said and
 * drawn of the answer stands here; how a document looks stands in {@code page}, and how lines and
 * words are drawn in {@code svg}.
 */
package dayworth.report.brief;

/** Answers out: CSV, JSON, terminal text and pictures; the only place that rounds for people. */
package dayworth.report;

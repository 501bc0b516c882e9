package dayworth.report.brief;

/** Numbers figures and tables as they come. */
final class Numbering {

  private int figures;
  private int tables;

  String figure() {
    return "Figure " + ++figures;
  }

  String table() {
    return "Table " + ++tables;
  }
}

package dayworth.casefile;

/**
 * A column that a file may have.
 *
 * @param name as it stands in the header
 * @param needed whether the file must have it
 * @param number whether its cells are numbers, which show the file's decimal mark
 */
record Column(String name, boolean needed, boolean number) {

  static Column needed(String name) {
    return new Column(name, true, false);
  }

  static Column optional(String name) {
    return new Column(name, false, false);
  }

  Column withNumbers() {
    return new Column(name, needed, true);
  }
}

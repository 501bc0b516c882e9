package dayworth.decision;

/** On whose account and at whose wish the work is accelerated. */
public enum Basis {
  MITIGATION("mitigation"),
  OWN_RECOVERY("own recovery"),
  AGREED("agreed"),
  DIRECTED("directed"),
  UNDER_PROTEST("under protest");

  private final String word;

  Basis(String word) {
    this.word = word;
  }

  /** The basis as it stands in a case. */
  public String word() {
    return word;
  }
}

package dayworth.decision;

/**
 * A file that a result was computed from.
 *
 * @param name its name within the case folder
 * @param sha256 the SHA-256 digest of its bytes, in lower-case hexadecimal
 */
public record InputFile(String name, String sha256) {}

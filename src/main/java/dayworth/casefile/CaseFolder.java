package dayworth.casefile;

import dayworth.decision.InputFile;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/** The files of a case folder: their texts and digests. */
final class CaseFolder {

  private static final List<String> SERVED =
      List.of(
          ActivityTable.FILE,
          LinkTable.FILE,
          TermsTable.FILE,
          HolidayTable.FILE,
          ProgressTable.FILE,
          SectionTable.FILE,
          RunningTable.FILE,
          LabourTable.FILE,
          PatternTable.FILE,
          PayTable.FILE,
          LossTable.FILE,
          MeasureTable.FILE,
          PackageTable.FILE);

  /** No figure hangs on these, so that results do not carry their digests. */
  private static final Set<String> BESIDE = Set.of(NotesText.FILE);

  /** Only other commands use these. */
  private static final Set<String> LEFT_ALONE = Set.of("ranges.csv");

  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private final Path folder;
  private final Findings findings;
  private final List<InputFile> inputs = new ArrayList<>();

  CaseFolder(Path folder, Findings findings) {
    this.folder = folder;
    this.findings = findings;
  }

  /** Digests of all files of the contract that a result can hang on, also of unsound ones. */
  List<InputFile> digests() {
    SERVED.stream().sorted().forEach(this::text);
    return inputs;
  }

  /** The files that were read, by name. */
  List<InputFile> inputs() {
    return inputs;
  }

  /** Reports what is wrong with the folder itself and the names in it. */
  void checkNames() {
    String name = String.valueOf(folder.getFileName());
    if (!Files.isDirectory(folder)) {
      String right = "a folder with " + ActivityTable.FILE + " in it";
      findings.problem(Place.whole(name).notice("no such folder", folder.toString(), right));
      return;
    }
    try (Stream<Path> entries = Files.list(folder)) {
      entries.map(entry -> entry.getFileName().toString()).forEach(this::checkName);
    } catch (IOException e) {
      findings.problem(Place.whole(name).notice("cannot be listed", "", "leave to read it"));
    }
    if (!Files.exists(folder.resolve(ActivityTable.FILE))) {
      findings.problem(
          Place.whole(ActivityTable.FILE).notice("is not there", "", "a case needs this file"));
    }
  }

  private void checkName(String name) {
    if (!SERVED.contains(name) && !LEFT_ALONE.contains(name) && !BESIDE.contains(name)) {
      List<String> known = new ArrayList<>(SERVED);
      Stream.of(LEFT_ALONE, BESIDE).flatMap(Set::stream).sorted().forEach(known::add);
      new Nearest(known)
          .to(name)
          .filter(near -> name.length() > 4)
          .ifPresent(
              near ->
                  findings.warning(
                      Place.whole(name).notice("is left alone", "", "perhaps meant as " + near)));
    }
  }

  boolean has(String name) {
    return Files.exists(folder.resolve(name));
  }

  /** The text of a file without its byte order mark; empty if there is none or it is faulty. */
  Optional<String> text(String name) {
    Optional<byte[]> bytes = bytes(name);
    bytes.ifPresent(some -> inputs.add(new InputFile(name, digest(some))));
    return bytes.flatMap(some -> decoded(name, some));
  }

  /** The text of a file that no figure hangs on, likewise. */
  Optional<String> textBeside(String name) {
    return bytes(name).flatMap(bytes -> decoded(name, bytes));
  }

  private Optional<byte[]> bytes(String name) {
    Path file = folder.resolve(name);
    if (!Files.exists(file)) {
      return Optional.empty();
    }
    try {
      return Optional.of(Files.readAllBytes(file));
    } catch (IOException e) {
      findings.problem(Place.whole(name).notice("cannot be read", "", "a file one may read"));
      return Optional.empty();
    }
  }

  private Optional<String> decoded(String name, byte[] bytes) {
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return Optional.of(text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text);
    } catch (CharacterCodingException e) {
      findings.problem(
          new Place(name, firstBadLine(bytes), "").notice("not UTF-8", "", "save it as UTF-8"));
      return Optional.empty();
    }
  }

  private static int firstBadLine(byte[] bytes) {
    int line = 1;
    int start = 0;
    for (int at = 0; at <= bytes.length; at++) {
      if (at == bytes.length || bytes[at] == '\n') {
        try {
          StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes, start, at - start));
        } catch (CharacterCodingException e) {
          return line;
        }
        start = at + 1;
        line++;
      }
    }
    return line;
  }

  private static String digest(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}

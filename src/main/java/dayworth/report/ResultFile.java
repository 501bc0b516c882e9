package dayworth.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import dayworth.buildup.BuildUp;
import dayworth.decision.Case;
import dayworth.decision.ClaimRefuted;
import dayworth.decision.Fault;
import dayworth.decision.InputFile;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;

/** A result.json that was read, to be rechecked. */
public final class ResultFile {

  private static final Set<String> COMMANDS = Set.of("curve", "meet", "weigh", "check", "buildup");

  private final JsonPlace all;
  private final String command;
  private final String programVersion;
  private final String caseName;
  private final TimeScale scale;
  private final Quantity lossFactor;
  private final Map<String, String> digests = new TreeMap<>();

  private ResultFile(JsonPlace all) throws ClaimRefuted, NoResult {
    this.all = all;
    this.command = all.get("command").text();
    if (!COMMANDS.contains(command)) {
      throw new NoResult("its command is " + Wording.safe(command) + ", which is not known here");
    }
    this.programVersion = all.get("program_version").text();
    this.caseName = all.get("case").get("name").text();
    for (JsonPlace input : all.get("inputs").items()) {
      digests.put(input.get("name").text(), input.get("sha256").text());
    }
    this.scale = all.find("evidence").isPresent() ? decimals(all.get("evidence")) : TimeScale.WHOLE;
    this.lossFactor = factor(all.find("loss_factor"));
  }

  /** Without labour a result has none. */
  private static Quantity factor(Optional<JsonPlace> found) throws ClaimRefuted {
    if (found.isEmpty()) {
      return Quantity.ONE;
    }
    Quantity factor = Quantity.of(found.get().number());
    if (factor.signum() < 0 || factor.compareTo(BuildUp.MOST_LOSS_FACTOR) > 0) {
      throw found.get().wrong("0 to " + BuildUp.MOST_LOSS_FACTOR);
    }
    return factor;
  }

  private static TimeScale decimals(JsonPlace evidence) throws ClaimRefuted {
    long decimals = evidence.get("time_decimals").whole();
    if (decimals < 0 || decimals > TimeScale.MOST_DECIMALS) {
      throw evidence.get("time_decimals").wrong("0 to " + TimeScale.MOST_DECIMALS);
    }
    return new TimeScale((int) decimals);
  }

  /**
   * Reads a result.
   *
   * @throws NoResult if it is none, or of an unknown version
   */
  public static ResultFile read(byte[] bytes) throws NoResult {
    try {
      JsonPlace all = new JsonPlace("", JsonValue.read(bytes));
      if (!all.get("format").text().equals(CaseJson.FORMAT)) {
        throw new NoResult("its format is not \"" + CaseJson.FORMAT + "\"");
      }
      if (all.get("format_version").whole() != CaseJson.FORMAT_VERSION) {
        throw new NoResult(
            "its format_version is "
                + all.get("format_version").value().shown()
                + "; this program knows "
                + CaseJson.FORMAT_VERSION);
      }
      return new ResultFile(all);
    } catch (JsonProcessingException broken) {
      String where =
          broken.getLocation() == null ? "" : " in line " + broken.getLocation().getLineNr();
      throw new NoResult("it is no JSON" + where);
    } catch (IOException broken) {
      throw new NoResult("it is no JSON: " + broken.getMessage());
    } catch (ClaimRefuted missing) {
      Fault fault = missing.fault();
      throw new NoResult(
          Wording.safe(fault.place() + ": found " + fault.found() + "; right is " + fault.right()));
    }
  }

  public String caseName() {
    return caseName;
  }

  /** How fine its times are. */
  public TimeScale scale() {
    return scale;
  }

  /** What all losses of output were multiplied by. */
  public Quantity lossFactor() {
    return lossFactor;
  }

  /** Where the files that are there differ from those that the result was computed from. */
  public List<Fault> inputFaults(List<InputFile> present) {
    List<Fault> faults = new ArrayList<>();
    Map<String, String> left = new TreeMap<>(digests);
    for (InputFile file : present) {
      String digest = left.remove(file.name());
      if (digest == null) {
        faults.add(new Fault(file.name(), "a new file", "none when the result was computed"));
      } else if (!digest.equals(file.sha256())) {
        faults.add(new Fault(file.name(), "sha256 " + file.sha256(), digest));
      }
    }
    left.forEach((name, digest) -> faults.add(new Fault(name, "no file", "sha256 " + digest)));
    return faults;
  }

  /** Rechecks every figure against the case that it was computed from. */
  public Verification verify(Case of) {
    try {
      return new ResultCheck(all, command, programVersion, of).verification();
    } catch (ClaimRefuted refuted) {
      return new Verification(List.of(refuted.fault()), List.of(), List.of());
    } catch (ArithmeticException | IllegalArgumentException beyond) {
      // Whoever wrote the figures may have written any: such as no date and no long can hold.
      Fault fault = new Fault("result", "figures beyond counting", "figures of the case");
      return new Verification(List.of(fault), List.of(), List.of());
    }
  }
}

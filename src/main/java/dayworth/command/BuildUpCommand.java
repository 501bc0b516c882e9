package dayworth.command;

import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.report.BuildUpFiles;
import dayworth.report.BuildUpText;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.report.picture.BuildUpPictures;
import dayworth.value.TimeScale;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** {@code dayworth buildup}. */
@Command(
    name = "buildup",
    description = "Build up what overtime, shifts and bigger crews cost and buy.")
final class BuildUpCommand extends CaseCommand {

  @Option(
      names = "--activity",
      paramLabel = "ID",
      description = "Show and draw this activity alone, line by line.")
  private Optional<String> activity = Optional.empty();

  @Option(names = "--no-pictures", description = "Write no pictures, only tables.")
  private boolean noPictures;

  @Override
  TimeScale finest() {
    return TimeScale.WHOLE;
  }

  @Override
  int answer(Case read) throws ResultsNotWritten {
    BuildUpAnswer answer = new BuildUpAnswer(read, asked(read));
    if (answer.all().activities().isEmpty()) {
      err().println("dayworth: " + BuildUpText.nothing(read));
      return Exit.NO_ANSWER;
    }
    Map<String, byte[]> files = new LinkedHashMap<>(BuildUpFiles.of(answer, Version.text()));
    Set<String> owned = new LinkedHashSet<>(files.keySet());
    owned.addAll(BuildUpPictures.NAMES);
    if (!noPictures) {
      files.putAll(BuildUpPictures.of(answer));
    }
    Path target = write(files, owned);
    List<String> lines = new ArrayList<>(BuildUpText.lines(answer, style(), CurveText.WIDEST));
    lines.addAll(CurveText.written(target.toString(), files.keySet(), CurveText.WIDEST));
    say(lines, ResultJson.ofBuildUp(answer, Version.text()));
    return Exit.DONE;
  }

  private OptionalInt asked(Case read) {
    if (activity.isEmpty()) {
      return OptionalInt.empty();
    }
    OptionalInt index = read.network().indexOf(activity.get());
    if (index.isEmpty()) {
      throw wrongUsage("--activity: the case has no activity " + activity.get());
    }
    if (read.buildUp().of(index.getAsInt()).isEmpty()) {
      String why = read.isToGo(index.getAsInt()) ? "labour.csv has no row for " : "finished is ";
      throw wrongUsage("--activity: nothing can be built up; " + why + activity.get());
    }
    return index;
  }
}

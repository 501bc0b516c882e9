package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.Progress;
import dayworth.decision.Status;
import java.io.IOException;
import java.util.stream.IntStream;

/** How far the work is; of each activity that has started its dates and what remains of it. */
final class StatusJson {

  private final Case of;
  private final Progress progress;

  StatusJson(Case of, Progress progress) {
    this.of = of;
    this.progress = progress;
  }

  void write(JsonText json) throws IOException {
    json.text("data_date", progress.dataDate().toString());
    json.number("finished", progress.finished());
    json.number("in_progress", progress.inProgress());
    Iterable<Integer> started =
        IntStream.range(0, of.network().size())
            .filter(i -> of.status(i).started().isPresent())
            .boxed()
            .toList();
    json.array("activities", started, this::activity);
  }

  private void activity(JsonText json, int index) throws IOException {
    Status status = of.status(index);
    json.text("activity", of.network().activity(index).id());
    json.text("started", status.started().orElseThrow().toString());
    if (status instanceof Status.Finished done) {
      json.text("finished", done.to().toString());
    } else if (status instanceof Status.InProgress rest) {
      json.number("remaining_duration", of.network().scale().units(rest.remaining()));
    }
  }
}

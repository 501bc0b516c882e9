package dayworth.report;

import dayworth.buildup.BuildUp;
import dayworth.buildup.OutputLoss;
import dayworth.decision.Case;
import dayworth.decision.Progress;
import dayworth.network.Network;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.List;

/** The members that every result begins with, and what is written of a case's activities. */
final class CaseJson {

  static final String FORMAT = "dayworth result";
  static final int FORMAT_VERSION = 1;

  private final Network network;

  CaseJson(Network network) {
    this.network = network;
  }

  static void writeHead(JsonText json, Case of, String command, String programVersion)
      throws IOException {
    json.text("format", FORMAT);
    json.number("format_version", FORMAT_VERSION);
    json.text("program_version", programVersion);
    json.text("command", command);
    json.object(
        "case",
        members -> {
          members.text("name", of.name());
          members.text("title", of.title());
          members.text("currency", of.currency());
          members.text("time_unit", of.unit().word());
          if (of.terms().calendar().isPresent()) {
            members.text("start_date", of.terms().calendar().get().startDate().toString());
          }
        });
    if (of.progress().isPresent()) {
      Progress progress = of.progress().get();
      json.object("status", members -> new StatusJson(of, progress).write(members));
    }
    if (!of.buildUp().isNone()) {
      losses(json, of.buildUp());
    }
    json.array(
        "inputs",
        of.inputs(),
        (members, input) -> {
          members.text("name", input.name());
          members.text("sha256", input.sha256());
        });
    json.array(
        "warnings",
        of.warnings(),
        (members, warning) -> {
          members.text("file", warning.file());
          members.number("line", warning.line());
          members.text("column", warning.column());
          members.text("wrong", warning.wrong());
          members.text("found", warning.found());
          members.text("right", warning.right());
        });
  }

  /** What was assumed of the output that is lost, by whom: an answer is worth no more than that. */
  private static void losses(JsonText json, BuildUp buildUp) throws IOException {
    json.number("loss_factor", WayFigures.number(buildUp.lossFactor()));
    json.array(
        "loss_sources",
        buildUp.bought(),
        (members, pattern) -> {
          OutputLoss loss = pattern.loss();
          members.text("pattern", pattern.name());
          members.texts("sources", loss.sources(loss.weeks().size()));
        });
  }

  BigDecimal units(long ticks) {
    return network.scale().units(ticks);
  }

  String id(int activity) {
    return network.activity(activity).id();
  }

  List<String> ids(List<Integer> activities) {
    return activities.stream().map(this::id).toList();
  }
}

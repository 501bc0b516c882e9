package dayworth.report;

import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.decision.CheckAnswer;
import dayworth.decision.CurveAnswer;
import dayworth.decision.MeetAnswer;
import dayworth.decision.WeighAnswer;

/**
 * The text of result.json: an answer for programs.
 *
 * <p>Money is a number with two decimals, a duration a number in time units with as many decimals
 * as it needs, an activity its id. The members and their order are part of the format's version.
 */
public final class ResultJson {

  private ResultJson() {}

  public static String ofCurve(CurveAnswer answer, String programVersion) {
    return JsonText.object(
        json -> {
          CaseJson.writeHead(json, answer.of(), "curve", programVersion);
          new CurveJson(answer).write(json);
        });
  }

  public static String ofMeet(MeetAnswer answer, String programVersion) {
    return JsonText.object(
        json -> {
          CaseJson.writeHead(json, answer.of(), "meet", programVersion);
          new MeetJson(answer).write(json);
          new CurveJson(answer.curve()).write(json);
        });
  }

  public static String ofWeigh(WeighAnswer answer, String programVersion) {
    return JsonText.object(
        json -> {
          CaseJson.writeHead(json, answer.of(), "weigh", programVersion);
          new WeighJson(answer).write(json);
        });
  }

  public static String ofBuildUp(BuildUpAnswer answer, String programVersion) {
    return JsonText.object(
        json -> {
          CaseJson.writeHead(json, answer.of(), "buildup", programVersion);
          new BuildUpJson(answer).write(json);
        });
  }

  public static String ofCheck(CheckAnswer answer, String programVersion) {
    return JsonText.object(
        json -> {
          CaseJson.writeHead(json, answer.of(), "check", programVersion);
          new CheckJson(answer).write(json);
        });
  }

  /** What every result begins with. */
  static String ofHead(Case of, String command, String programVersion) {
    return JsonText.object(json -> CaseJson.writeHead(json, of, command, programVersion));
  }
}

package dayworth.report;

import dayworth.engine.Obstacle;
import dayworth.network.Link;
import dayworth.network.Network;
import java.io.IOException;

/** One term of the chain that stops the project; the terms' units add up to the shortest finish. */
final class ObstacleJson {

  private final Network network;

  ObstacleJson(Network network) {
    this.network = network;
  }

  void write(JsonText json, Obstacle obstacle) throws IOException {
    if (obstacle instanceof Obstacle.AtShortest at) {
      json.text("term", "at_shortest");
      json.text("activity", id(at.activity()));
    } else if (obstacle instanceof Obstacle.CannotBeLonger longer) {
      json.text("term", "cannot_be_longer");
      json.text("activity", id(longer.activity()));
    } else if (obstacle instanceof Obstacle.Lag lag) {
      Link link = network.link(lag.link());
      json.text("term", "lag");
      json.text("predecessor", id(link.predecessor()));
      json.text("successor", id(link.successor()));
      json.text("relation", link.relation().name());
    } else if (obstacle instanceof Obstacle.NotBefore start) {
      json.text("term", "not_before");
      json.text("activity", id(start.activity()));
    } else if (obstacle instanceof Obstacle.NotFinishedBefore finish) {
      json.text("term", "not_finished_before");
      json.text("activity", id(finish.activity()));
    }
    json.number("units", network.scale().units(obstacle.ticks()));
  }

  private String id(int activity) {
    return network.activity(activity).id();
  }
}

package dayworth.contract;

import dayworth.engine.branching.Charge;
import dayworth.engine.branching.Window;
import dayworth.network.Moment;
import dayworth.value.Money;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Stream;

/** A section's damages less its bonus, as a charge for its finish. */
final class SectionCharge implements Charge {

  private final Section section;
  private final Counting counting;

  SectionCharge(Section section, Counting counting) {
    this.section = section;
    this.counting = counting;
  }

  @Override
  public String name() {
    return section.name();
  }

  @Override
  public List<Moment> moments() {
    return List.of(Moment.finishOf(section.activity()));
  }

  @Override
  public boolean rises(int k) {
    return true;
  }

  /**
   * Ends of working days, where money by the date rises, and the bends of money by the tick: one
   * that lies between two ticks bends at both.
   */
  @Override
  public long[] points(int k, Window window) {
    TreeSet<Long> points = new TreeSet<>();
    counting
        .calendar()
        .ifPresent(dates -> points.addAll(dates.endsOfDays(window.least(), window.most())));
    Stream.concat(
            section.damages().bends(section.due(), counting),
            section.bonus().bends(section.due(), counting))
        .flatMap(bend -> Stream.of(bend, bend + 1))
        .forEach(points::add);
    TreeSet<Long> inside = new TreeSet<>(points.subSet(window.least(), window.most()));
    inside.add(window.least());
    inside.add(window.most());
    return inside.stream().mapToLong(Long::longValue).toArray();
  }

  @Override
  public Money at(long[] times) {
    Money damages = section.damages().at(times[0], section.due(), counting);
    return damages.minus(section.bonus().at(times[0], section.due(), counting));
  }

  @Override
  public List<Part> within(List<Window> windows) {
    return List.of(time -> at(new long[] {time}));
  }
}

package dayworth.decision;

import java.util.List;

/**
 * What people wrote beside the figures, for the brief alone.
 *
 * @param asked what is asked of the client
 * @param needs what the client must do
 * @param assumptions what the plan rests on
 */
public record Notes(List<Passage> asked, List<Passage> needs, List<Passage> assumptions) {

  /** None. */
  public static final Notes NONE = new Notes(List.of(), List.of(), List.of());

  public Notes {
    asked = List.copyOf(asked);
    needs = List.copyOf(needs);
    assumptions = List.copyOf(assumptions);
  }

  /** Some of what was written, each text on one line. */
  public sealed interface Passage {

    /** Its sentences, or what it lists. */
    List<String> texts();
  }

  /** Sentences that belong together. */
  public record Paragraph(String text) implements Passage {

    @Override
    public List<String> texts() {
      return List.of(text);
    }
  }

  /** What stands below each other. */
  public record Items(List<String> texts) implements Passage {

    public Items {
      texts = List.copyOf(texts);
    }
  }
}

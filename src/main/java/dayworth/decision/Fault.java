package dayworth.decision;

/**
 * Something in a result that does not hold.
 *
 * @param place the member, such as {@code curve[3].direct_cost}
 * @param found what stands there
 * @param right what would be right
 */
public record Fault(String place, String found, String right) {}

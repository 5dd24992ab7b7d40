package weighhouse.recalculate.program;

import java.util.List;

/**
 * A compiled formula.
 *
 * @param root evaluates it
 * @param cells single cells that it reads, in the order of their numbers in the nodes
 * @param ranges all else that it reads
 * @param drawing whether it draws random numbers or reads the clock
 * @param pointing whether what it reads is known only when it runs
 * @param array whether its result may fill more than one cell
 */
public record Program(
    Node root,
    List<Footprint> cells,
    List<Footprint> ranges,
    boolean drawing,
    boolean pointing,
    boolean array) {
  public Program {
    cells = List.copyOf(cells);
    ranges = List.copyOf(ranges);
  }
}

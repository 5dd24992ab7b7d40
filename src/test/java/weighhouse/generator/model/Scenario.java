package weighhouse.generator.model;

import java.util.Arrays;
import java.util.List;

/** Who is treated for what, in which words. */
public record Scenario(Words words, List<String> progressions, List<String> living) {
  /** A scenario in one of the languages given. */
  public static Scenario draw(Dice dice, List<String> languages) {
    String language = dice.pick(languages);
    List<String> row =
        dice.pick(
            Tables.rows("scenarios").stream().filter(it -> it.get(0).equals(language)).toList());
    List<String> arms = split(row.get(1));
    return new Scenario(
        new Words(language, arms.get(0), arms.get(1)), split(row.get(2)), split(row.get(3)));
  }

  private static List<String> split(String field) {
    return Arrays.stream(field.split(",")).map(String::strip).toList();
  }

  /** Living states and death. */
  public List<String> states() {
    return java.util.stream.Stream.concat(
            living.stream(), java.util.stream.Stream.of(words.of("row.dead")))
        .toList();
  }

  /** Index of death. */
  public int dead() {
    return living.size();
  }
}

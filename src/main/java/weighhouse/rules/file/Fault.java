package weighhouse.rules.file;

/**
 * Something wrong in a rule file.
 *
 * @param file its path as given
 * @param line from 1
 * @param column from 1
 * @param message what is wrong and what to do
 */
public record Fault(String file, int line, int column, String message) {
  @Override
  public String toString() {
    return file + ":" + line + ":" + column + ": " + message;
  }
}

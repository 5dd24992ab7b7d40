package weighhouse.cli;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import weighhouse.report.text.Visible;
import weighhouse.rules.Rule;
import weighhouse.rules.RuleBook;

/** Lists rules, explains one, or checks a house's own. */
@Command(
    name = "rules",
    description = "Lists the rules, explains one, or checks a house's own.",
    mixinStandardHelpOptions = true)
final class RulesCommand implements Callable<Integer> {
  private static final int WIDTH = 88;

  private final Console console;

  @Parameters(arity = "0..1", paramLabel = "ID", description = "The rule to explain.")
  private String id;

  @Option(
      names = "--check",
      paramLabel = "DIR",
      description = "Checks the rules in a folder: their form, their examples, their sources.")
  private Path check;

  RulesCommand(Setting setting) {
    this.console = setting.console();
  }

  @Override
  public Integer call() throws Exception {
    if (check != null && !Files.isDirectory(check)) {
      throw new UnusableException(
          Visible.text(check.toString()) + " is no folder: --check takes a folder of rules.");
    }
    RuleBook book = check == null ? RuleBook.shipped() : RuleBook.load(check);
    if (id != null) {
      explain(book);
    } else if (check != null) {
      int own = book.rules().size() - RuleBook.shipped().rules().size();
      console.say("The rules are in order; " + own + " of them are new.");
    } else {
      list(book.rules());
    }
    return Status.PASS;
  }

  private void list(List<Rule> rules) {
    int width = rules.stream().mapToInt(rule -> rule.id().length()).max().orElse(0);
    String family = "";
    for (Rule rule : rules) {
      if (!rule.family().equals(family)) {
        family = rule.family();
        console.say(family);
      }
      String padding = " ".repeat(width - rule.id().length());
      console.say("  " + rule.id() + padding + "  " + Visible.text(rule.title()));
    }
  }

  private void explain(RuleBook book) throws UnusableException {
    Rule rule =
        book.rule(id)
            .orElseThrow(
                () ->
                    new UnusableException(
                        "No rule is called " + Visible.text(id) + ": run 'rules' for the list."));
    console.say(rule.id() + " (" + rule.family() + ", " + rule.level() + ")");
    say(rule.title());
    say(rule.explain());
    say("For the author: " + rule.ask());
    for (Rule.Citation citation : rule.sources()) {
      RuleBook.Source source = book.source(citation.key());
      String at = citation.at() == null ? "" : ", " + citation.at();
      String doi = source.doi() == null ? "" : " https://doi.org/" + source.doi();
      say(source.citation() + at + doi);
    }
  }

  /** A paragraph with a blank line in front. */
  private void say(String text) {
    console.say("");
    StringBuilder line = new StringBuilder();
    for (String word : Visible.text(text).strip().split("\\s+", -1)) {
      if (line.length() > 0 && line.length() + word.length() >= WIDTH) {
        console.say(line.toString());
        line.setLength(0);
      }
      line.append(line.length() == 0 ? "" : " ").append(word);
    }
    console.say(line.toString());
  }
}

package weighhouse.generator.book;

import java.util.HashMap;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the <code>{symbol}</code>s of formula templates stand for. */
public final class Symbols {
  private static final Pattern PLACE = Pattern.compile("\\{([^{}]+)}");

  private final Map<String, CellAt> cells = new HashMap<>();
  private final Map<String, String> texts = new HashMap<>();

  /** The symbol is a reference to this cell. */
  public void cell(String symbol, CellAt at) {
    cells.put(symbol, at);
  }

  /** The symbol is this text wherever it stands: a name, a lookup, a number. */
  public void text(String symbol, String text) {
    texts.put(symbol, text);
  }

  /** Whether anything answers to the symbol. */
  public boolean knows(String symbol) {
    return cells.containsKey(symbol) || texts.containsKey(symbol);
  }

  /** The cell where a symbol's value stands. */
  public CellAt at(String symbol) {
    return Optional.ofNullable(cells.get(symbol))
        .orElseThrow(() -> new NoSuchElementException("no cell for {" + symbol + "}"));
  }

  /** Template to formula text, as seen from a sheet. */
  public String resolve(String template, String sheet) {
    Matcher place = PLACE.matcher(template);
    StringBuilder text = new StringBuilder();
    while (place.find()) {
      place.appendReplacement(text, Matcher.quoteReplacement(one(place.group(1), sheet)));
    }
    return place.appendTail(text).toString();
  }

  private String one(String symbol, String sheet) {
    String text = texts.get(symbol);
    return text != null ? resolve(text, sheet) : at(symbol).from(sheet);
  }
}

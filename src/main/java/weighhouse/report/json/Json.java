package weighhouse.report.json;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.Collection;
import weighhouse.audit.Figure;
import weighhouse.audit.OutcomeFigures;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** A JSON stream with the few shapes that an audit's object is made of. */
final class Json {
  /** A step that writes. */
  interface Step {
    void run() throws IOException;
  }

  /** Writes the fields of one item. */
  interface Item<T> {
    void write(T item) throws IOException;
  }

  private final JsonGenerator out;
  private final Workbook workbook;

  Json(JsonGenerator out, Workbook workbook) {
    this.out = out;
    this.workbook = workbook;
  }

  String show(CellAddress cell) {
    return workbook.show(cell);
  }

  String show(CellRange range) {
    return workbook.show(range);
  }

  void object(Step fields) throws IOException {
    out.writeStartObject();
    fields.run();
    out.writeEndObject();
  }

  void object(String name, Step fields) throws IOException {
    out.writeFieldName(name);
    object(fields);
  }

  <T> void list(String name, Collection<T> items, Item<T> fields) throws IOException {
    out.writeArrayFieldStart(name);
    for (T item : items) {
      object(() -> fields.write(item));
    }
    out.writeEndArray();
  }

  void texts(String name, Collection<String> texts) throws IOException {
    out.writeArrayFieldStart(name);
    for (String text : texts) {
      out.writeString(text);
    }
    out.writeEndArray();
  }

  void numbers(String name, Collection<Double> numbers) throws IOException {
    out.writeArrayFieldStart(name);
    for (double number : numbers) {
      if (Double.isFinite(number)) {
        out.writeNumber(number);
      } else {
        out.writeNull();
      }
    }
    out.writeEndArray();
  }

  /** Null where there is no text. */
  void text(String name, String text) throws IOException {
    out.writeFieldName(name);
    if (text == null) {
      out.writeNull();
    } else {
      out.writeString(text);
    }
  }

  void integer(String name, int number) throws IOException {
    out.writeNumberField(name, number);
  }

  /** Null where there is no finite number. */
  void number(String name, double number) throws IOException {
    out.writeFieldName(name);
    if (Double.isFinite(number)) {
      out.writeNumber(number);
    } else {
      out.writeNull();
    }
  }

  void bool(String name, boolean value) throws IOException {
    out.writeBooleanField(name, value);
  }

  void nothing(String name) throws IOException {
    out.writeNullField(name);
  }

  void outcome(OutcomeFigures outcome, String corrected) throws IOException {
    text("cell", show(outcome.cell()));
    text("label", outcome.label());
    pair("now", outcome.now(), corrected, outcome.corrected());
  }

  /** Two figures; the errors that stand in their place follow as {@code error}. */
  void pair(String firstName, Figure first, String secondName, Figure second) throws IOException {
    number(firstName, first.number());
    number(secondName, second.number());
    if (first.error() != null) {
      text("error", first.error());
    } else if (second.error() != null) {
      text("error", second.error());
    }
  }
}

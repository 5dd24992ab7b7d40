package weighhouse.report.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.audit.Figure;

class NumbersTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "0 | 0",
        "0.7 | 0.7",
        "0.220898 | 0.2209",
        "0.0000211 | 0.0000211",
        "0.00000211 | 2.11E-6",
        "18734.21 | 18,734",
        "1234567 | 1,234,567",
        "-414.62 | −414.6",
        "-1234.5 | −1,235",
        "1E20 | 1E20",
        "999.99 | 1,000",
        "NaN | –",
      })
  void showsFourDigitsAndWholeNumbers(double number, String shown) {
    assertEquals(shown, Numbers.show(number));
  }

  @Test
  void twoFiguresAreToldApart() {
    Figure now = Figure.of(0.1234567);
    Figure correct = Figure.of(0.1234589);
    int digits = Numbers.digits(now, correct);
    assertEquals("0.123457", Numbers.show(now, digits));
    assertEquals("0.123459", Numbers.show(correct, digits));
  }

  @Test
  void changeNeedsTwoNumbers() {
    assertEquals("+15 %", Numbers.change(Figure.of(18734), Figure.of(21480)));
    assertEquals("−100 %", Numbers.change(Figure.of(-1), Figure.of(-2)));
    assertEquals("–", Numbers.change(Figure.of(0), Figure.of(1)));
    assertEquals("–", Numbers.change(new Figure(Double.NaN, "#N/A"), Figure.of(1)));
  }
}

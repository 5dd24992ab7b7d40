package weighhouse.effect.curve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Effects that fade: the ends are the same, the middle tells the conventions apart. */
class WaningTest {

  @ParameterizedTest
  @EnumSource(Waning.class)
  void startsWholeAndEndsAtOne(Waning waning) {
    assertEquals(0.5, waning.ratio(0, 0.5, 2, 6));
    assertEquals(0.5, waning.ratio(2, 0.5, 2, 6));
    assertEquals(1, waning.ratio(6, 0.5, 2, 6));
    assertEquals(1, waning.ratio(60, 0.5, 2, 6));
    assertEquals(1, waning.ratio(2, 0.5, 2, 2));
    assertTrue(waning.ratio(3, 0.5, 2, 6) < waning.ratio(4, 0.5, 2, 6));
  }

  @Test
  void theMiddleDiffers() {
    assertEquals(0.75, Waning.LINEAR_IN_RATIO.ratio(4, 0.5, 2, 6), 1e-15);
    assertEquals(Math.sqrt(0.5), Waning.LINEAR_IN_LOG.ratio(4, 0.5, 2, 6), 1e-15);
  }

  @ParameterizedTest
  @EnumSource(Waning.class)
  void whatIsOutOfItsDomainGivesNaN(Waning waning) {
    assertTrue(Double.isNaN(waning.ratio(-1, 0.5, 2, 6)));
    assertTrue(Double.isNaN(waning.ratio(1, -0.5, 2, 6)));
    assertTrue(Double.isNaN(waning.ratio(1, 0.5, 6, 2)));
    assertTrue(Double.isNaN(waning.ratio(1, 0.5, -1, 2)));
  }
}

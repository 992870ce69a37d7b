package org.fallwright.maps.frame;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.slf4j.LoggerFactory;

/**
 * The coordinate library's jar carries an old copy of the logging interface. If it comes before the
 * real one on the class path, everything logged vanishes and newer calls fail.
 */
class LoggingTest {
  @Test
  void theLoggerIsTheOneChosen() {
    assertThat(LoggerFactory.getLogger(LoggingTest.class).getClass().getName())
        .isEqualTo("ch.qos.logback.classic.Logger");
    LoggerFactory.getLogger(LoggingTest.class).atDebug().log("newer calls work as well");
  }
}

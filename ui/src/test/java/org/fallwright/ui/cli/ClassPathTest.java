package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.slf4j.LoggerFactory;

class ClassPathTest {
  @Test
  void loggingComesFromItsOwnJarNotFromAnOldCopyInAnother() {
    assertThat(place(LoggerFactory.class)).contains("slf4j-api");
    assertThat(place(LoggerFactory.getILoggerFactory().getClass())).contains("logback-classic");
  }

  private static String place(Class<?> c) {
    return c.getProtectionDomain().getCodeSource().getLocation().toString();
  }
}

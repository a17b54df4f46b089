package perveance.launch;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class PackagingTest {

  /** The build starts the main class by its name; a rename must be seen here first. */
  @Test
  void theBuildNamesTheMainClass() {
    assertEquals("perveance.launch.Main", Main.class.getName());
  }
}

package perveance.architecture;

import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every package uses only what its allow-list names; no exemptions. */
class LayersTest {
  /** Fewer classes than this means that the import found the wrong place. */
  private static final int CLASSES_AT_LEAST = 600;

  /** Places kept free for what the plan foresees. */
  private static final Set<String> TO_COME = Set.of("engine.search", "engine.bench");

  @Test
  void theWholeProgramWasImported() {
    assertTrue(
        Program.CLASSES.size() >= CLASSES_AT_LEAST,
        () -> "only " + Program.CLASSES.size() + " classes were found");
  }

  /** A layer that was renamed would otherwise be an empty promise. */
  @Test
  void everyLayerHoldsSomething() {
    List<String> empty =
        Layers.ALL.stream()
            .filter(
                layer ->
                    Program.CLASSES.stream()
                        .noneMatch(
                            type ->
                                Layers.of(type.getPackageName()).filter(layer::equals).isPresent()))
            .map(Layer::name)
            .filter(name -> !TO_COME.contains(name))
            .toList();
    assertEquals(List.of(), empty);
  }

  @Test
  void everyClassBelongsToANamedLayer() {
    List<String> strays =
        Program.CLASSES.stream()
            .filter(type -> Layers.of(type.getPackageName()).isEmpty())
            .map(type -> type.getFullName() + " is in no layer; place its package in Layers")
            .toList();
    assertEquals(List.of(), strays);
  }

  @Test
  void theAllowListsThemselvesPointOnlyInwards() {
    Set<String> inner = new HashSet<>();
    for (Layer layer : Layers.ALL) {
      assertTrue(inner.containsAll(layer.layers()), () -> layer.name() + " points outwards");
      assertTrue(inner.add(layer.name()), () -> layer.name() + " is listed twice");
    }
  }

  @TestFactory
  Stream<DynamicTest> everyLayerUsesOnlyWhatItIsPermitted() {
    return Layers.ALL.stream()
        .map(
            layer ->
                DynamicTest.dynamicTest(
                    layer.name(),
                    () -> assertEquals("", String.join("\n", layer.breaches(Program.CLASSES)))));
  }

  @Test
  void theTopPackagesAreFreeOfCycles() {
    slices().matching("perveance.(*)..").should().beFreeOfCycles().check(Program.CLASSES);
  }

  @Test
  void theEnginesPackagesAreFreeOfCycles() {
    slices().matching("perveance.engine.(*)..").should().beFreeOfCycles().check(Program.CLASSES);
  }

  @Test
  void allPackagesAreFreeOfCyclesAtAnyDepth() {
    slices().matching("perveance.(**)").should().beFreeOfCycles().check(Program.CLASSES);
  }
}

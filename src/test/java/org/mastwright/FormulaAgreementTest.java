package org.mastwright;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.reflect.Field;
import java.lang.reflect.Modifier;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.mastwright.working.Formula;
import org.mastwright.working.TemplateEvaluator;

/**
 * What is printed is what was calculated: the template of every formula, read by an evaluator of
 * its own, agrees with the method it is bound to. Formulas are found as static fields of all main
 * classes; nothing has to be registered.
 */
class FormulaAgreementTest {
  private static final int DRAWS = 200;

  /** Draws outside the range of a formula give no number on either side and do not count. */
  private static final int LEAST_COUNTED = 40;

  private static final double TOLERANCE = 1e-12;

  private record Named(String place, Formula formula) {}

  @TestFactory
  Stream<DynamicTest> templateAgreesWithMethod() {
    return formulas().stream().map(n -> DynamicTest.dynamicTest(n.place, () -> compare(n.formula)));
  }

  @Test
  void findsTheFormulas() {
    List<Named> all = formulas();
    for (String known : List.of("ActuatorDisc.CT_HIGH", "SeparationChecks.DISTANCE")) {
      assertTrue(all.stream().anyMatch(n -> n.place.endsWith(known)), known + " not in " + all);
    }
  }

  @Test
  void evaluatorReadsTheNotation() {
    Map<String, Double> x = Map.of("a", 3.0, "f_u", 2.0);
    assertEquals(0.5 * 9 - 2 / 4.0, TemplateEvaluator.evaluate("½·{a}² − {f_u}/4", x), 1e-15);
    assertEquals(1.5, TemplateEvaluator.evaluate("|{f_u} − {a}| + min(½, {a}, 7)", x), 1e-15);
    assertEquals(-8, TemplateEvaluator.evaluate("−{f_u}^{a}", x), 1e-14);
    assertEquals(Math.sqrt(5), TemplateEvaluator.evaluate("√({a} + {f_u})", x), 1e-15);
    assertEquals(3e-3, TemplateEvaluator.evaluate("{a}/(1 kW)", x), 1e-18);
    assertEquals(2.5e-6, TemplateEvaluator.evaluate("2.5·10⁻⁶", x), 1e-20);
    assertEquals(6, TemplateEvaluator.evaluate("12/{f_u}/{a}·{a}", x), 1e-14);
    assertThrows(IllegalArgumentException.class, () -> TemplateEvaluator.evaluate("{a} {f_u}", x));
    assertThrows(IllegalArgumentException.class, () -> TemplateEvaluator.evaluate("{b}", x));
    assertThrows(IllegalArgumentException.class, () -> TemplateEvaluator.evaluate("2·({a}", x));
  }

  @Test
  void wrongTemplateIsNoticed() {
    assertNotEquals(
        TemplateEvaluator.evaluate("{a}·{b}", Map.of("a", 2.0, "b", 3.0)),
        TemplateEvaluator.evaluate("{a}/{b}", Map.of("a", 2.0, "b", 3.0)));
  }

  private static void compare(Formula formula) {
    Random random = new Random(20310504);
    int counted = 0;
    for (int i = 0; i < DRAWS; i++) {
      double[] si = draw(random, formula.vars(), Math.pow(10, (i % 10) - 4.5));
      Map<String, Double> values = new HashMap<>();
      for (int k = 0; k < si.length; k++) {
        values.put(formula.vars().get(k).symbol(), si[k]);
      }
      double printed = TemplateEvaluator.evaluate(formula.template(), values);
      double method;
      try {
        method = formula.evaluate(si);
      } catch (IllegalArgumentException | ArithmeticException outside) {
        continue;
      }
      if (Double.isFinite(printed) || Double.isFinite(method)) {
        counted++;
        double size = Math.max(Math.abs(printed), Math.abs(method));
        assertEquals(printed, method, TOLERANCE * Math.max(size, 1e-300), formula.template());
      }
    }
    assertTrue(
        counted >= LEAST_COUNTED,
        formula.symbol() + " = " + formula.template() + " gave only " + counted + " numbers");
  }

  /**
   * Values within one power of ten in the units they are printed in, so that every size occurs and
   * none drowns the others.
   */
  private static double[] draw(Random random, List<Formula.Var> vars, double scale) {
    double[] si = new double[vars.size()];
    for (int k = 0; k < si.length; k++) {
      si[k] = vars.get(k).unit().toSi(scale * Math.pow(10, random.nextDouble()));
    }
    return si;
  }

  private static List<Named> formulas() {
    List<Named> all = new ArrayList<>();
    for (Class<?> type : mainClasses()) {
      for (Field field : type.getDeclaredFields()) {
        if (Modifier.isStatic(field.getModifiers()) && field.getType() == Formula.class) {
          field.setAccessible(true);
          try {
            all.add(
                new Named(type.getSimpleName() + "." + field.getName(), (Formula) field.get(null)));
          } catch (IllegalAccessException e) {
            throw new IllegalStateException(e);
          }
        }
      }
    }
    return all;
  }

  private static List<Class<?>> mainClasses() {
    try {
      Path root =
          Path.of(Formula.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      try (Stream<Path> files = Files.walk(root.resolve("org/mastwright"))) {
        return files
            .filter(f -> f.toString().endsWith(".class"))
            .map(f -> root.relativize(f).toString().replace('/', '.').replace('\\', '.'))
            .filter(n -> !n.endsWith("package-info.class"))
            .map(n -> n.substring(0, n.length() - ".class".length()))
            .sorted()
            .<Class<?>>map(FormulaAgreementTest::load)
            .toList();
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  private static Class<?> load(String name) {
    try {
      return Class.forName(name);
    } catch (ClassNotFoundException e) {
      throw new IllegalStateException(e);
    }
  }
}

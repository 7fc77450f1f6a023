package org.mastwright.file;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.Optional;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

/** More on each fault of a tower file and each open point, from the page {@code faults.yaml}. */
public final class FaultCatalogue {
  private static final String PAGE = "/org/mastwright/file/faults.yaml";

  private FaultCatalogue() {}

  /** The words for an id such as {@code E2}. */
  public static Optional<String> of(String id) {
    try (InputStream in = FaultCatalogue.class.getResourceAsStream(PAGE)) {
      Map<?, ?> page = (Map<?, ?>) new Load(LoadSettings.builder().build()).loadFromInputStream(in);
      return Optional.ofNullable(page.get(id)).map(Object::toString);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

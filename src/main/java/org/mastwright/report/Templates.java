package org.mastwright.report;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import org.thymeleaf.TemplateEngine;
import org.thymeleaf.context.Context;
import org.thymeleaf.exceptions.TemplateEngineException;
import org.thymeleaf.templatemode.TemplateMode;
import org.thymeleaf.templateresolver.AbstractConfigurableTemplateResolver;
import org.thymeleaf.templateresolver.ClassLoaderTemplateResolver;
import org.thymeleaf.templateresolver.FileTemplateResolver;

/** Fills the templates; a folder given by the user stands before the built-in ones. */
final class Templates {
  private static final String FOLDER = "report-templates/";

  private final TemplateEngine engine = new TemplateEngine();

  Templates(Options options) {
    options
        .templates()
        .ifPresent(
            folder -> {
              if (!Files.isDirectory(folder)) {
                throw new ReportException("templates: " + folder + " is not a folder");
              }
              engine.addTemplateResolver(files(folder));
            });
    engine.addTemplateResolver(
        settled(
            new ClassLoaderTemplateResolver(Templates.class.getClassLoader()), FOLDER, 2, false));
  }

  private static FileTemplateResolver files(Path folder) {
    return settled(new FileTemplateResolver(), folder + "/", 1, true);
  }

  private static <T extends AbstractConfigurableTemplateResolver> T settled(
      T resolver, String prefix, int order, boolean checkExistence) {
    resolver.setPrefix(prefix);
    resolver.setSuffix(".html");
    resolver.setOrder(order);
    resolver.setCheckExistence(checkExistence);
    resolver.setTemplateMode(TemplateMode.HTML);
    resolver.setCharacterEncoding("UTF-8");
    resolver.setCacheable(true);
    return resolver;
  }

  /** The whole report as XHTML. */
  String report(ReportView view) {
    try {
      return engine.process("report", new Context(Locale.ROOT, Map.of("r", view)));
    } catch (TemplateEngineException e) {
      throw new ReportException("template: " + rootMessage(e), e);
    }
  }

  private static String rootMessage(Throwable e) {
    Throwable cause = e;
    while (cause.getCause() != null) {
      cause = cause.getCause();
    }
    return e.getMessage() + " – " + cause.getMessage();
  }

  /** A page that touches text, a table, an equation and a drawing. */
  static String warmUpPage() {
    Svg svg = new Svg(10, 10);
    svg.line(0, 0, 10, 10, Svg.INK).text(1, 5, 2, "a").circle(5, 5, 2, Svg.INK);
    return "<html lang=\"en\"><head><title>a</title><meta name=\"subject\" content=\"a\"/>"
        + "<style>body{font-family:'Noto Sans'} @page{size:A4}</style></head><body><h1>a</h1>"
        + "<table><thead><tr><th>a</th></tr></thead><tbody><tr><td>b</td></tr></tbody></table>"
        + svg.end("a")
        + "</body></html>";
  }
}

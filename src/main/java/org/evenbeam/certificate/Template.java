package org.evenbeam.certificate;

import com.samskivert.mustache.Mustache;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import org.evenbeam.trail.Sha256;

/** The certificate's template: XHTML with places to fill, and its style. Every value is escaped. */
final class Template {
  private static final String PLACE = "/report-templates/certificate";

  private final String page;
  private final String style;

  /** The template shipped with the program. */
  Template() {
    this.page = resource(PLACE + ".xhtml");
    this.style = resource(PLACE + ".css");
  }

  /** SHA-256 of page and style together. */
  String sha256() {
    return Sha256.hex((page + style).getBytes(StandardCharsets.UTF_8));
  }

  /** The page with its places filled. */
  String fill(Map<String, Object> model) {
    Map<String, Object> complete = new HashMap<>(model);
    complete.put("style", style);
    return Mustache.compiler().compile(page).execute(complete);
  }

  private static String resource(String name) {
    try (InputStream stream = Template.class.getResourceAsStream(name)) {
      if (stream == null) {
        throw new IllegalStateException("the program was built without " + name);
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}

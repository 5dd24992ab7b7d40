package weighhouse.report.html;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import org.jsoup.nodes.DataNode;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Entities;
import weighhouse.report.text.Visible;

/**
 * An empty page with our style sheet and script inside. Its policy lets the browser load nothing,
 * run that one script and apply that one style sheet.
 */
public final class Page {
  private final Document document = Document.createShell("");

  /** A page in English with that title. */
  public Page(String title) {
    document.outputSettings().prettyPrint(false).escapeMode(Entities.EscapeMode.xhtml);
    document.prependChild(new org.jsoup.nodes.DocumentType("html", "", ""));
    Element html = document.selectFirst("html");
    html.attr("lang", "en");
    String style = resource("report.css");
    String script = resource("report.js");
    head(title, style, script);
    document.body().appendElement("script").appendChild(new DataNode(script));
  }

  private void head(String title, String style, String script) {
    Element head = document.head();
    head.appendElement("meta").attr("charset", "utf-8");
    head.appendElement("meta")
        .attr("http-equiv", "Content-Security-Policy")
        .attr(
            "content",
            "default-src 'none'; style-src 'sha256-"
                + sha256(style)
                + "'; script-src 'sha256-"
                + sha256(script)
                + "'; base-uri 'none'; form-action 'none'");
    meta("viewport", "width=device-width, initial-scale=1");
    meta("color-scheme", "light dark");
    meta("referrer", "no-referrer");
    head.appendElement("title").text(Visible.text(title));
    head.appendElement("style").appendChild(new DataNode(style));
  }

  private void meta(String name, String content) {
    document.head().appendElement("meta").attr("name", name).attr("content", content);
  }

  /** Where the sections go, in front of the script. */
  public Element body() {
    Element content = document.body().selectFirst("div.page");
    return content != null ? content : document.body().prependElement("div").attr("class", "page");
  }

  public Document document() {
    return document;
  }

  private static String resource(String name) {
    try (InputStream in = Page.class.getResourceAsStream("/weighhouse/report/" + name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String sha256(String text) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return Base64.getEncoder().encodeToString(hash);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java runtime has SHA-256", e);
    }
  }
}

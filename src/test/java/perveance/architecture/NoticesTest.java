package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

/** The README names every library that the program ships, in the version that is shipped. */
class NoticesTest {
  @Test
  void everyShippedLibraryIsNamedWithItsVersion()
      throws IOException, SAXException, ParserConfigurationException {
    List<String> rows =
        Sources.lines(Path.of("README.md")).stream().filter(line -> line.startsWith("| ")).toList();
    List<String> missing = new ArrayList<>();
    int shipped = 0;
    Element project = pom();
    for (Element dependency : children(child(project, "dependencies"), "dependency")) {
      if (!children(dependency, "scope").isEmpty()) {
        continue;
      }
      shipped++;
      String artifact = child(dependency, "artifactId").getTextContent();
      String version = resolved(child(dependency, "version").getTextContent(), project);
      if (rows.stream()
          .noneMatch(row -> row.contains("`" + artifact + "`") && row.contains(" " + version))) {
        missing.add("README.md, notices: | ... (`" + artifact + "` " + version + ") | ... |");
      }
    }
    assertTrue(shipped > 5);
    assertEquals("", String.join("\n", missing));
  }

  private static Element pom() throws IOException, SAXException, ParserConfigurationException {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(Path.of("pom.xml").toFile())
        .getDocumentElement();
  }

  private static String resolved(String text, Element project) {
    return text.startsWith("${")
        ? child(child(project, "properties"), text.substring(2, text.length() - 1)).getTextContent()
        : text;
  }

  private static Element child(Element parent, String name) {
    return children(parent, name).get(0);
  }

  private static List<Element> children(Element parent, String name) {
    List<Element> found = new ArrayList<>();
    NodeList nodes = parent.getChildNodes();
    for (int i = 0; i < nodes.getLength(); i++) {
      if (nodes.item(i) instanceof Element element && element.getTagName().equals(name)) {
        found.add(element);
      }
    }
    return found;
  }
}

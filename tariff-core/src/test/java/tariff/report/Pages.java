// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** A report read back: its elements are closed and nested as XML wants them, so any XML reader follows it. */
record Pages(Document document) {
    static Pages read(String html) {
        try {
            DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
            factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
            return new Pages(factory.newDocumentBuilder().parse(new InputSource(new StringReader(html))));
        } catch (Exception e) {
            throw new AssertionError("the report is not well formed: " + e.getMessage(), e);
        }
    }

    List<Element> all(String name) {
        return inside(document.getDocumentElement(), name);
    }

    List<String> texts(String name) {
        return all(name).stream().map(Pages::text).toList();
    }

    /** The element with this id. */
    Element at(String id) {
        return all("*").stream()
                .filter(each -> each.getAttribute("id").equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("nothing has the id " + id));
    }

    /** The rows of a table, head first, each as its cells. */
    List<List<String>> rows(String id) {
        List<List<String>> rows = new ArrayList<>();
        for (Element row : inside(at(id), "tr")) {
            rows.add(inside(row, "*").stream().map(Pages::text).toList());
        }
        return rows;
    }

    static List<Element> inside(Element element, String name) {
        NodeList found = element.getElementsByTagName(name);
        List<Element> all = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            all.add((Element) found.item(i));
        }
        return all;
    }

    static String text(Element element) {
        return element.getTextContent().strip();
    }
}

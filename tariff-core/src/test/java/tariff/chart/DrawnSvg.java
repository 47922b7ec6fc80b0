// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import javax.xml.XMLConstants;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** A chart read back by the parser of the JDK, with everything that reaches outside the file switched off. */
final class DrawnSvg {
    /** What an element covers, in px. */
    record Box(double left, double top, double right, double bottom, String what) {
        boolean meets(Box other) {
            return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
        }
    }

    final Element root;

    DrawnSvg(String svg) {
        try {
            DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
            factory.setFeature(XMLConstants.FEATURE_SECURE_PROCESSING, true);
            factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
            factory.setXIncludeAware(false);
            factory.setExpandEntityReferences(false);
            root = factory.newDocumentBuilder()
                    .parse(new InputSource(new StringReader(svg)))
                    .getDocumentElement();
        } catch (Exception failure) {
            throw new AssertionError("not well-formed: " + failure.getMessage(), failure);
        }
    }

    List<Element> elements(String name) {
        NodeList found = root.getElementsByTagName(name);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            elements.add((Element) found.item(i));
        }
        return elements;
    }

    List<Element> everything() {
        List<Element> all = elements("*");
        all.add(root);
        return all;
    }

    List<String> words() {
        return elements("text").stream().map(Node::getTextContent).toList();
    }

    /** What each text covers; widths as the charts estimate them. */
    List<Box> textBoxes() {
        return elements("text").stream().map(DrawnSvg::textBox).toList();
    }

    /** What each shape covers, patterns apart. */
    List<Box> shapeBoxes() {
        List<Box> boxes = new ArrayList<>();
        for (Element each : everything()) {
            if (!each.getParentNode().getNodeName().equals("pattern")) {
                boxes.addAll(shape(each));
            }
        }
        return boxes;
    }

    private static List<Box> shape(Element each) {
        return switch (each.getTagName()) {
            case "rect" ->
                List.of(box(
                        each,
                        at(each, "x"),
                        at(each, "y"),
                        at(each, "x") + at(each, "width"),
                        at(each, "y") + at(each, "height")));
            case "line" -> List.of(box(each, at(each, "x1"), at(each, "y1"), at(each, "x2"), at(each, "y2")));
            case "circle" ->
                List.of(box(
                        each,
                        at(each, "cx") - at(each, "r"),
                        at(each, "cy") - at(each, "r"),
                        at(each, "cx") + at(each, "r"),
                        at(each, "cy") + at(each, "r")));
            case "polyline", "polygon" -> points(each);
            case "path" -> marker(each);
            default -> List.of();
        };
    }

    private static List<Box> points(Element each) {
        List<Box> boxes = new ArrayList<>();
        for (String point : each.getAttribute("points").split(" ", -1)) {
            String[] xy = point.split(",", -1);
            boxes.add(box(
                    each,
                    Double.parseDouble(xy[0]),
                    Double.parseDouble(xy[1]),
                    Double.parseDouble(xy[0]),
                    Double.parseDouble(xy[1])));
        }
        return boxes;
    }

    private static List<Box> marker(Element each) {
        String[] xy = each.getAttribute("transform").replaceAll("[^0-9. -]", "").split(" ", -1);
        double x = Double.parseDouble(xy[0]);
        double y = Double.parseDouble(xy[1]);
        return List.of(box(each, x - 5, y - 5, x + 5, y + 5));
    }

    private static Box textBox(Element text) {
        int size = Integer.parseInt(text.getAttribute("font-size"));
        double width = Lettering.width(text.getTextContent(), size);
        double x = at(text, "x");
        double left = switch (text.getAttribute("text-anchor")) {
            case "middle" -> x - width / 2;
            case "end" -> x - width;
            default -> x;
        };
        double y = at(text, "y");
        return new Box(left, y - 0.8 * size, left + width, y + 0.2 * size, text.getTextContent());
    }

    private static Box box(Element each, double x1, double y1, double x2, double y2) {
        return new Box(Math.min(x1, x2), Math.min(y1, y2), Math.max(x1, x2), Math.max(y1, y2), each.getTagName());
    }

    static double at(Element element, String attribute) {
        return Double.parseDouble(element.getAttribute(attribute));
    }
}

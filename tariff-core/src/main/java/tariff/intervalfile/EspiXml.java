// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.io.InputStream;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/**
 * Walks down and along the elements of an XML text as it comes. A document type is refused, so that nothing is ever expanded or fetched,
 * and no text is held beyond a length that meter data never have.
 */
final class EspiXml {
    private static final int LONGEST_TEXT = 2_000;

    private final XMLStreamReader xml;

    EspiXml(InputStream file) throws XMLStreamException {
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
        xml = factory.createXMLStreamReader(file);
    }

    /** The line that the reader stands on. */
    int line() {
        return xml.getLocation().getLineNumber();
    }

    /** Goes on to the next child of the element it stands in and names it; nothing at the end of the element, or of the text. */
    String child() throws XMLStreamException {
        while (xml.hasNext()) {
            switch (xml.next()) {
                case XMLStreamConstants.START_ELEMENT -> {
                    return xml.getLocalName();
                }
                case XMLStreamConstants.END_ELEMENT -> {
                    return "";
                }
                case XMLStreamConstants.DTD -> throw new XMLStreamException("a document type", xml.getLocation());
                default -> {}
            }
        }
        return "";
    }

    String attribute(String name) {
        return Objects.requireNonNullElse(xml.getAttributeValue(null, name), "");
    }

    /** Goes to the end of the element it stands in, past everything inside. */
    void skip() throws XMLStreamException {
        for (int depth = 1; depth > 0; ) {
            depth += child().isEmpty() ? -1 : 1;
        }
    }

    /** The text of the element it stands in, to its end, without blanks around it; what is nested is passed over. */
    String text() throws XMLStreamException {
        StringBuilder text = new StringBuilder();
        for (int depth = 1; depth > 0; ) {
            int event = xml.next();
            if (event == XMLStreamConstants.START_ELEMENT) {
                depth++;
            } else if (event == XMLStreamConstants.END_ELEMENT) {
                depth--;
            } else if (xml.isCharacters() && depth == 1) {
                if (text.length() + xml.getTextLength() > LONGEST_TEXT) {
                    throw new XMLStreamException("a text too long", xml.getLocation());
                }
                text.append(xml.getText());
            }
        }
        return text.toString().strip();
    }

    /** The texts of the children of the element it stands in, to its end. */
    Map<String, String> texts() throws XMLStreamException {
        Map<String, String> texts = new HashMap<>();
        for (String name = child(); !name.isEmpty(); name = child()) {
            texts.put(name, text());
        }
        return texts;
    }
}

/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.io;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import javax.xml.XMLConstants;
import javax.xml.parsers.ParserConfigurationException;
import javax.xml.parsers.SAXParserFactory;
import org.xml.sax.Attributes;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;
import org.xml.sax.SAXParseException;
import org.xml.sax.XMLReader;
import org.xml.sax.helpers.DefaultHandler;

/**
 * Format and version of study files. A first pass over the bytes, before any model is built, refuses what is not well-formed, what has a
 * document type (and with it external entities and entity expansion), and what another version wrote.
 *
 * <p>The version is the number at the end of the namespace of the root element. Optional features may be added within a version. When a
 * change is not compatible, the number rises and the reader of {@link StudyFiles} converts files of the older versions; so far there is
 * one version.
 */
final class StudyFormat {

    static final String NAMESPACE_STEM = "urn:spanfield:study:";
    static final int VERSION = 1;
    static final int DEEPEST = 64;

    private StudyFormat() {
    }

    static void check(byte[] content, String file) throws StudyFileException {
        if (content.length == 0) {
            throw new StudyFileException("The file '" + file + "' is empty. Restore it from a copy, or start a new study.");
        }
        try {
            SAXParserFactory factory = SAXParserFactory.newInstance();
            factory.setNamespaceAware(true);
            factory.setFeature(XMLConstants.FEATURE_SECURE_PROCESSING, true);
            factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
            XMLReader reader = factory.newSAXParser().getXMLReader();
            RootCheck handler = new RootCheck(file);
            reader.setContentHandler(handler);
            reader.setErrorHandler(handler);
            reader.parse(new InputSource(new ByteArrayInputStream(content)));
        } catch (RefusedException refused) {
            throw new StudyFileException(refused.getMessage());
        } catch (SAXParseException broken) {
            throw new StudyFileException("The file '" + file + "' is not a readable study: " + reason(broken) + " (line "
                + broken.getLineNumber() + ", column " + broken.getColumnNumber() + "). Restore it from a copy, or repair the line.");
        } catch (SAXException | ParserConfigurationException | IOException broken) {
            throw new StudyFileException("The file '" + file + "' is not a readable study: " + broken.getMessage()
                + ". Restore it from a copy.");
        }
    }

    private static String reason(SAXParseException broken) {
        String message = String.valueOf(broken.getMessage());
        if (message.contains("DOCTYPE")) {
            return "it declares a document type, which studies never do and which is refused for safety";
        }
        return "the text is not well-formed: " + (message.endsWith(".") ? message.substring(0, message.length() - 1) : message);
    }

    /** Carries a refusal through the parser. */
    private static final class RefusedException extends SAXException {

        private static final long serialVersionUID = 1L;

        RefusedException(String message) {
            super(message);
        }
    }

    /** Looks at the root element and at the depth, and lets everything else pass. */
    private static final class RootCheck extends DefaultHandler {

        private final String file;
        private int depth;

        RootCheck(String file) {
            this.file = file;
        }

        @Override
        public void startElement(String uri, String name, String qualifiedName, Attributes attributes) throws SAXException {
            if (depth == 0) {
                checkRoot(uri, name);
            }
            depth++;
            if (depth > DEEPEST) {
                throw new RefusedException("The file '" + file + "' nests elements deeper than any study. It is not a Spanfield study.");
            }
        }

        @Override
        public void endElement(String uri, String name, String qualifiedName) {
            depth--;
        }

        @Override
        public void error(SAXParseException broken) throws SAXException {
            throw broken;
        }

        private void checkRoot(String uri, String name) throws SAXException {
            if (!uri.startsWith(NAMESPACE_STEM) || !name.equals("Study")) {
                throw new RefusedException("The file '" + file + "' is not a Spanfield study: its root element is '" + name
                    + "'. Choose a file that Spanfield has saved.");
            }
            String version = uri.substring(NAMESPACE_STEM.length());
            if (version.equals(Integer.toString(VERSION))) {
                return;
            }
            throw new RefusedException("The file '" + file + "' has the study format " + version + "; this version of Spanfield reads format "
                + VERSION + ". Use a newer version of Spanfield.");
        }
    }
}

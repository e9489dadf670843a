package plateledger.report;

import java.awt.Dimension;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Locale;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGIDGenerator;
import org.jfree.chart.JFreeChart;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** A chart as scalable vector graphics (SVG 1.1): text stays text, the same chart gives the same bytes. */
final class SvgDrawing {
    private static final String SVG = "http://www.w3.org/2000/svg";
    private static final int PRECISION = 2; // decimals of px

    private SvgDrawing() {}

    /**
     * Draws a chart.
     *
     * @param name name of the figure; makes ids unique where several figures stand in one page
     * @param description what it shows, for readers who do not see it
     * @param chart the chart
     * @param width px
     * @param height px
     * @return an {@code svg} element without XML declaration, to be put into a page or, after
     *     {@link #standalone}, into a file
     */
    static String draw(String name, String description, JFreeChart chart, int width, int height) {
        Document document = emptyDocument();
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment("");
        context.setPrecision(PRECISION);
        context.setIDGenerator(new SVGIDGenerator() {
            private int count;

            @Override
            public String generateID(String prefix) {
                count++;
                return name + "-" + prefix + count;
            }
        });
        SVGGraphics2D graphics = new SVGGraphics2D(context, false);
        graphics.setSVGCanvasSize(new Dimension(width, height));
        chart.draw(graphics, new Rectangle2D.Double(0, 0, width, height));
        Element root = graphics.getRoot();
        root.setAttributeNS(null, "viewBox", String.format(Locale.ROOT, "0 0 %d %d", width, height));
        root.setAttributeNS(null, "role", "img");
        root.setAttributeNS(null, "aria-label", description);
        StringWriter text = new StringWriter();
        try {
            graphics.stream(root, text, false, false);
        } catch (IOException e) {
            throw new UncheckedIOException(e); // a string does not fail
        }
        String svg = text.toString().replace("\r\n", "\n");
        int start = svg.indexOf("<svg");
        return svg.substring(start)
                .replace("\"genericDefs\"", "\"" + name + "-defs\"") // the one id that has no generator
                .replace("'" + Fonts.FAMILY + "'", "'" + Fonts.FAMILY + "', sans-serif");
    }

    private static Document emptyDocument() {
        try {
            return DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument(SVG, "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("every Java platform has a document builder", e);
        }
    }

    /** A drawing as a file of its own. */
    static String standalone(String svg) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n" + svg + (svg.endsWith("\n") ? "" : "\n");
    }
}

package plateledger.gui.chart;

import java.awt.Toolkit;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.awt.image.RenderedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.ext.awt.image.spi.ImageWriter;
import org.apache.batik.ext.awt.image.spi.ImageWriterParams;
import org.apache.batik.ext.awt.image.spi.ImageWriterRegistry;
import org.apache.batik.svggen.SVGGraphics2D;
import org.jfree.chart.JFreeChart;
import org.w3c.dom.Document;

/** Charts as pictures: to the clipboard, as PNG, as SVG. */
public final class Picture {
    private static final double PNG_SCALE = 2.0;

    private Picture() {}

    /** The chart as pixels, at twice the size so that it stays sharp in a document. */
    public static BufferedImage pixels(JFreeChart chart, int width, int height) {
        return chart.createBufferedImage((int) (width * PNG_SCALE), (int) (height * PNG_SCALE), width, height, null);
    }

    /** Puts the chart onto the clipboard. */
    public static void copy(JFreeChart chart, int width, int height) {
        Toolkit.getDefaultToolkit().getSystemClipboard().setContents(new Copied(pixels(chart, width, height)), null);
    }

    /**
     * Writes the chart into a file, as SVG if its name ends in {@code .svg}, else as PNG.
     *
     * @throws IOException if the file cannot be written
     */
    public static void write(JFreeChart chart, int width, int height, Path file) throws IOException {
        if (String.valueOf(file.getFileName())
                .toLowerCase(java.util.Locale.ROOT)
                .endsWith(".svg")) {
            writeSvg(chart, width, height, file);
        } else if (!ImageIO.write(pixels(chart, width, height), "png", file.toFile())) {
            throw new IOException("no PNG writer on this machine");
        }
    }

    private static void writeSvg(JFreeChart chart, int width, int height, Path file) throws IOException {
        // The SVG library finds its writer for pattern cells by this registry and ships none in the part used here.
        ImageWriterRegistry.getInstance().register(new CellWriter());
        SVGGraphics2D graphics = new SVGGraphics2D(emptySvg());
        graphics.setSVGCanvasSize(new java.awt.Dimension(width, height));
        chart.draw(graphics, new Rectangle2D.Double(0, 0, width, height));
        try (Writer out = new OutputStreamWriter(Files.newOutputStream(file), StandardCharsets.UTF_8)) {
            graphics.stream(out, true);
        }
    }

    private static Document emptySvg() throws IOException {
        try {
            return DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument("http://www.w3.org/2000/svg", "svg", null);
        } catch (ParserConfigurationException problem) {
            throw new IOException("no XML document can be made on this machine", problem);
        }
    }

    /** Writes the cells of hatched fills into an SVG. */
    private record CellWriter() implements ImageWriter {
        @Override
        public void writeImage(RenderedImage image, OutputStream out) throws IOException {
            ImageIO.write(image, "png", out);
        }

        @Override
        public void writeImage(RenderedImage image, OutputStream out, ImageWriterParams ignored) throws IOException {
            writeImage(image, out);
        }

        @Override
        public String getMIMEType() {
            return "image/png";
        }
    }

    /** A picture on the clipboard. */
    private record Copied(BufferedImage image) implements Transferable {
        @Override
        public DataFlavor[] getTransferDataFlavors() {
            return new DataFlavor[] {DataFlavor.imageFlavor};
        }

        @Override
        public boolean isDataFlavorSupported(DataFlavor flavor) {
            return DataFlavor.imageFlavor.equals(flavor);
        }

        @Override
        public Object getTransferData(DataFlavor flavor) throws UnsupportedFlavorException {
            if (!isDataFlavorSupported(flavor)) {
                throw new UnsupportedFlavorException(flavor);
            }
            return image;
        }
    }
}

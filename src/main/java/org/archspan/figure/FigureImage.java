package org.archspan.figure;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOInvalidTreeException;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;

/** Turns a figure into PNG at 300 dots an inch, or into SVG with real text. */
public final class FigureImage {
  private static final int DOTS_PER_INCH = 300;
  private static final String SVG = "http://www.w3.org/2000/svg";

  static {
    // otherwise vertical axis labels become outlines instead of text
    org.jfree.chart.text.TextUtils.setUseDrawRotatedStringWorkaround(false);
  }

  private FigureImage() {
  }

  /** The figure as PNG, its resolution noted in the file. */
  public static byte[] png(Figure figure) {
    double scale = DOTS_PER_INCH / 72.0;
    Page page = figure.page();
    BufferedImage image = new BufferedImage((int) Math.round(page.width() * scale),
        (int) Math.round(page.height() * scale), BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    graphics.setRenderingHint(RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BICUBIC);
    graphics.scale(scale, scale);
    draw(figure, page, graphics);
    graphics.dispose();
    try {
      return encoded(image);
    } catch (IOException impossible) {
      throw new UncheckedIOException("an image in memory could not be encoded", impossible);
    }
  }

  /** The figure on a page of its colour, which reaches to the last, broken dot. */
  private static void draw(Figure figure, Page page, Graphics2D graphics) {
    graphics.setPaint(page.colour());
    graphics.fill(new Rectangle2D.Double(0.0, 0.0, page.width() + 1.0, page.height() + 1.0));
    figure.draw(graphics, new Rectangle2D.Double(0.0, 0.0, page.width(), page.height()));
  }

  private static byte[] encoded(BufferedImage image) throws IOException {
    ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
    ImageWriteParam parameters = writer.getDefaultWriteParam();
    IIOMetadata metadata = writer.getDefaultImageMetadata(new ImageTypeSpecifier(image), parameters);
    noteResolution(metadata);
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (ImageOutputStream stream = ImageIO.createImageOutputStream(bytes)) {
      writer.setOutput(stream);
      writer.write(metadata, new IIOImage(image, null, metadata), parameters);
    } finally {
      writer.dispose();
    }
    return bytes.toByteArray();
  }

  private static void noteResolution(IIOMetadata metadata) throws IIOInvalidTreeException {
    String perMetre = Long.toString(Math.round(DOTS_PER_INCH / 0.0254));
    IIOMetadataNode physical = new IIOMetadataNode("pHYs");
    physical.setAttribute("pixelsPerUnitXAxis", perMetre);
    physical.setAttribute("pixelsPerUnitYAxis", perMetre);
    physical.setAttribute("unitSpecifier", "meter");
    IIOMetadataNode root = new IIOMetadataNode("javax_imageio_png_1.0");
    root.appendChild(physical);
    metadata.mergeTree("javax_imageio_png_1.0", root);
  }

  /** The figure as an SVG document. */
  public static String svg(Figure figure) {
    Document document = document();
    SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
    context.setComment(null);
    context.setPrecision(4);
    context.setImageHandler(new EmbeddedImages());
    SVGGraphics2D graphics = new SVGGraphics2D(context, false);
    Page page = figure.page();
    Dimension size = new Dimension((int) Math.ceil(page.width()), (int) Math.ceil(page.height()));
    graphics.setSVGCanvasSize(size);
    draw(figure, page, graphics);
    StringWriter text = new StringWriter();
    try {
      graphics.stream(text, false);
    } catch (IOException impossible) {
      throw new UncheckedIOException("a drawing in memory could not be written", impossible);
    }
    return withTitle(text.toString(), size, figure.description());
  }

  /** Size in points, a view box for scaling, and the description for those who cannot see the figure. */
  private static String withTitle(String svg, Dimension size, String description) {
    int start = svg.indexOf("<svg ");
    int end = svg.indexOf('>', start);
    String head = svg.substring(start, end).replaceFirst(" width=\"[^\"]*\"", "").replaceFirst(" height=\"[^\"]*\"", "");
    String described = description.replace("&", "&amp;").replace("<", "&lt;");
    return svg.substring(0, start) + head + " role=\"img\" width=\"" + size.width + "pt\" height=\"" + size.height
        + "pt\" viewBox=\"0 0 " + size.width + " " + size.height + "\"><title>" + described + "</title>"
        + svg.substring(end + 1);
  }

  private static Document document() {
    try {
      DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
      factory.setNamespaceAware(true);
      return factory.newDocumentBuilder().getDOMImplementation().createDocument(SVG, "svg", null);
    } catch (ParserConfigurationException impossible) {
      throw new IllegalStateException("the Java runtime has no XML documents", impossible);
    }
  }

  /** The bytes of the SVG document, UTF-8. */
  public static byte[] svgBytes(Figure figure) {
    return svg(figure).getBytes(StandardCharsets.UTF_8);
  }
}

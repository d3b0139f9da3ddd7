package org.archspan.figure;

import java.awt.Image;
import java.awt.image.BufferedImage;
import java.awt.image.RenderedImage;
import java.awt.image.renderable.RenderableImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Base64;
import javax.imageio.ImageIO;
import org.apache.batik.svggen.DefaultImageHandler;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2DIOException;
import org.apache.batik.svggen.SVGGraphics2DRuntimeException;
import org.w3c.dom.Element;

/** Puts images into the SVG document itself, as PNG in base 64. */
final class EmbeddedImages extends DefaultImageHandler {
  private static final String XLINK = "http://www.w3.org/1999/xlink";

  @Override
  protected void handleHREF(Image image, Element element, SVGGeneratorContext context) throws SVGGraphics2DIOException {
    BufferedImage copy = new BufferedImage(image.getWidth(null), image.getHeight(null), BufferedImage.TYPE_INT_ARGB);
    copy.createGraphics().drawImage(image, 0, 0, null);
    handleHREF((RenderedImage) copy, element, context);
  }

  @Override
  protected void handleHREF(RenderedImage image, Element element, SVGGeneratorContext context)
      throws SVGGraphics2DIOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try {
      ImageIO.write(image, "png", bytes);
    } catch (IOException reason) {
      throw new SVGGraphics2DIOException("an image could not be encoded: " + reason.getMessage(), reason);
    }
    element.setAttributeNS(XLINK, "xlink:href",
        "data:image/png;base64," + Base64.getEncoder().encodeToString(bytes.toByteArray()));
    element.setAttribute("preserveAspectRatio", "none");
  }

  @Override
  protected void handleHREF(RenderableImage image, Element element, SVGGeneratorContext context)
      throws SVGGraphics2DRuntimeException {
    throw new SVGGraphics2DRuntimeException("figures draw rendered images only");
  }
}

package org.rodside.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import org.knowm.xchart.style.markers.Marker;

/** A ring with a white inside: a pin. */
final class RingMarker extends Marker {

    private final double radius;
    private final float rim;

    RingMarker(double scale) {
        this.radius = 5 * scale;
        this.rim = (float) (2 * scale);
    }

    @Override
    public void paint(Graphics2D graphics, double x, double y, int size) {
        Color colour = graphics.getColor();
        Ellipse2D ring = new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius);
        graphics.setColor(Color.WHITE);
        graphics.fill(ring);
        graphics.setColor(colour);
        graphics.setStroke(new BasicStroke(rim));
        graphics.draw(ring);
    }
}

package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureLook;
import org.saddlebook.charts.api.FigurePoint;
import org.saddlebook.presentation.api.DisplayUnit;

/** A sheet that can be asked what lies under a pixel. */
final class Drawing implements FigureDrawing {
    private final Node.Figure figure;
    private final Sheet sheet;
    private final ValueText text;
    private final DisplayUnit unitX;
    private final List<FigurePoint> points;

    Drawing(Node.Figure figure, Map<String, String> cautions, FigureLook look) {
        this.figure = figure;
        sheet = new Sheet(figure, cautions, look);
        text = new ValueText(figure);
        unitX = DisplayUnit.of(figure.x().unit());
        points = pointsInView();
    }

    private List<FigurePoint> pointsInView() {
        List<FigurePoint> found = new ArrayList<>();
        Rectangle2D area = sheet.area();
        for (int number = 0; number < figure.layers().size(); number++) {
            Layer raw = figure.layers().get(number);
            if (raw.kind() != Layer.Kind.MEASURED
                    && raw.kind() != Layer.Kind.EXCLUDED
                    && raw.kind() != Layer.Kind.PREDICTED) {
                continue;
            }
            Layer shown = sheet.layers().get(number);
            double[] rawX = raw.x();
            double[] rawY = raw.y();
            for (int i = 0; i < raw.size(); i++) {
                double px = sheet.horizontal(shown.x()[i]);
                double py = sheet.anyVertical(shown.y()[i]);
                boolean inView = px >= area.getMinX() - 1
                        && px <= area.getMaxX() + 1
                        && py >= area.getMinY() - 1
                        && py <= area.getMaxY() + 1;
                if (inView) {
                    found.add(new FigurePoint(
                            raw.kind(), number, i, rawX[i], rawY[i], px, py, text.point(raw.kind(), shown, i)));
                }
            }
        }
        found.sort(Comparator.comparingDouble(FigurePoint::px).thenComparingDouble(FigurePoint::py));
        return List.copyOf(found);
    }

    @Override
    public Node.Figure figure() {
        return figure;
    }

    @Override
    public int width() {
        return sheet.width();
    }

    @Override
    public int height() {
        return sheet.height();
    }

    @Override
    public Rectangle2D area() {
        return sheet.area();
    }

    @Override
    public void paint(Graphics2D g) {
        sheet.draw(g);
    }

    @Override
    public List<FigurePoint> points() {
        return points;
    }

    @Override
    public Optional<FigurePoint> pointAt(double px, double py, double reach) {
        FigurePoint nearest = null;
        double least = reach;
        for (FigurePoint point : points) {
            double distance = Math.hypot(point.px() - px, point.py() - py);
            if (distance <= least) {
                least = distance;
                nearest = point;
            }
        }
        return Optional.ofNullable(nearest);
    }

    @Override
    public List<String> readingsAt(double px) {
        Rectangle2D area = sheet.area();
        if (!(px >= area.getMinX() && px <= area.getMaxX())) {
            return List.of();
        }
        List<String> lines = new ArrayList<>();
        lines.add(text.abscissa(sheet.abscissa(px)));
        for (Layer layer : sheet.layers()) {
            if (layer.kind() == Layer.Kind.LINE) {
                crossing(layer, px).ifPresent(py -> lines.add(text.line(layer.label(), sheet.ordinate(py))));
            }
        }
        return lines;
    }

    /** Vertical coordinate of a drawn line at a horizontal one; empty where it is not drawn or passes more than once. */
    private Optional<Double> crossing(Layer layer, double px) {
        double[] x = layer.x();
        double[] y = layer.y();
        Double found = null;
        for (int i = 0; i + 1 < x.length; i++) {
            double here = sheet.horizontal(x[i]) - px;
            double there = sheet.horizontal(x[i + 1]) - px;
            if (here * there <= 0 && here != there) {
                double low = sheet.anyVertical(y[i]);
                double py = low + (sheet.anyVertical(y[i + 1]) - low) * here / (here - there);
                if (found != null && Math.abs(found - py) > 0.5) {
                    return Optional.empty();
                }
                found = py;
            }
        }
        return Optional.ofNullable(found);
    }

    @Override
    public double px(double x) {
        return sheet.horizontal(unitX.value(x));
    }

    @Override
    public double x(double px) {
        double shown = sheet.abscissa(px);
        return unitX.powerOfTen() == 0 ? shown : shown * StrictMath.pow(10, -unitX.powerOfTen());
    }

    @Override
    public Optional<FigureLook.Zoom> part(Rectangle2D rectangle) {
        double lowX = sheet.abscissa(rectangle.getMinX());
        double highX = sheet.abscissa(rectangle.getMaxX());
        double lowY = sheet.ordinate(rectangle.getMaxY());
        double highY = sheet.ordinate(rectangle.getMinY());
        boolean kelvin = figure.x().unit().equals("K");
        boolean usable = lowX < highX
                && lowY < highY
                && Double.isFinite(lowX)
                && Double.isFinite(highX)
                && Double.isFinite(lowY)
                && Double.isFinite(highY)
                && (!kelvin || (lowX > 1 && highX < 20_000));
        // Closer than this, neighbouring marks of an axis can no longer be told apart by their numbers.
        boolean wideEnough = highX - lowX > 1e-6 * Math.abs(highX + lowX) && highY - lowY > 1e-9 * Math.abs(highY);
        return usable && wideEnough ? Optional.of(new FigureLook.Zoom(lowX, highX, lowY, highY)) : Optional.empty();
    }

    @Override
    public String description() {
        return sheet.description();
    }

    @Override
    public byte[] svg() {
        SvgPaper paper = new SvgPaper(sheet.width(), sheet.height());
        sheet.draw(paper);
        return paper.document(figure.title(), sheet.description());
    }

    @Override
    public byte[] png(double scale) {
        if (!(scale >= 1 && scale <= 8)) {
            throw new IllegalArgumentException("scale must lie between 1 and 8: " + scale);
        }
        BufferedImage image = new BufferedImage(
                (int) Math.ceil(sheet.width() * scale),
                (int) Math.ceil(sheet.height() * scale),
                BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        try {
            g.setPaint(
                    sheet.palette() == Palette.LIGHT
                            ? java.awt.Color.WHITE
                            : sheet.palette().paper());
            g.fillRect(0, 0, image.getWidth(), image.getHeight());
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            g.scale(scale, scale);
            sheet.draw(g);
        } finally {
            g.dispose();
        }
        try {
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            ImageIO.setUseCache(false);
            if (!ImageIO.write(image, "png", out)) {
                throw new IllegalStateException("this Java has no PNG writer");
            }
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}

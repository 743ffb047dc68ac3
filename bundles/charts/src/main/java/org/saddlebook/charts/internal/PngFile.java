package org.saddlebook.charts.internal;

import org.osgi.service.component.annotations.Component;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureFile;

/** Figures as PNG files, fine enough for print at half a page. */
@Component
public final class PngFile implements FigureFile {
    private static final double SCALE = 4;

    @Override
    public String extension() {
        return "png";
    }

    @Override
    public byte[] bytes(FigureDrawing drawing) {
        return drawing.png(SCALE);
    }
}

package org.saddlebook.charts.internal;

import org.osgi.service.component.annotations.Component;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureFile;

/** Figures as SVG files. */
@Component
public final class SvgFile implements FigureFile {
    @Override
    public String extension() {
        return "svg";
    }

    @Override
    public byte[] bytes(FigureDrawing drawing) {
        return drawing.svg();
    }
}

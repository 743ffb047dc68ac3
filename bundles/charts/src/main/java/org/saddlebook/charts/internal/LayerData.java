package org.saddlebook.charts.internal;

import org.jfree.data.xy.AbstractXYDataset;
import org.saddlebook.api.findings.Layer;

/** One layer as JFreeChart sees it: a single series. */
final class LayerData extends AbstractXYDataset {
    private static final long serialVersionUID = 1L;

    private final transient Layer layer;
    private final transient double[] x;
    private final transient double[] y;

    LayerData(Layer layer) {
        this.layer = layer;
        x = layer.x();
        y = layer.y();
    }

    @Override
    public int getSeriesCount() {
        return 1;
    }

    @Override
    public String getSeriesKey(int series) {
        return layer.label();
    }

    @Override
    public int getItemCount(int series) {
        return x.length;
    }

    @Override
    public Number getX(int series, int item) {
        return x[item];
    }

    @Override
    public Number getY(int series, int item) {
        return y[item];
    }

    @Override
    public boolean equals(Object other) {
        return this == other;
    }

    @Override
    public int hashCode() {
        return System.identityHashCode(this);
    }

    @Override
    public Object clone() throws CloneNotSupportedException {
        return super.clone();
    }
}

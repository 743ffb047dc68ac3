package org.saddlebook.charts.internal;

import java.util.List;
import org.saddlebook.api.findings.Layer;

/** Which ink and pattern a layer gets. */
final class LayerOrder {
    private LayerOrder() {}

    /** Order of a line among the lines; a band goes with the line of its name, or with the line of its own order. */
    static int of(List<Layer> layers, int index) {
        Layer wanted = layers.get(index);
        int lines = 0;
        int sameKindBefore = 0;
        int named = -1;
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            if (i < index && layer.kind() == wanted.kind()) {
                sameKindBefore++;
            }
            if (layer.kind() == Layer.Kind.LINE) {
                if (named < 0 && layer.label().equals(wanted.label())) {
                    named = lines;
                }
                lines++;
            }
        }
        return wanted.kind() == Layer.Kind.LINE || named < 0 ? sameKindBefore : named;
    }
}

package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonCursor;

/** Figures out of JSON. */
final class FigureReader {
    private static final List<String> FIGURE_KEYS = List.of("figure", "title", "x", "y", "layers", "cautions");
    private static final List<String> AXIS_KEYS = List.of("label", "unit", "scale");
    private static final List<String> LAYER_KEYS = List.of("kind", "label", "x", "y", "lower", "upper");

    private FigureReader() {}

    static Node read(JsonCursor at) throws InputException {
        at.onlyKeys(FIGURE_KEYS);
        List<Layer> layers = new ArrayList<>();
        for (JsonCursor layer : at.member("layers").items()) {
            layers.add(layer(layer));
        }
        return new Node.Figure(
                at.member("figure").text(),
                at.member("title").text(),
                axis(at.member("x")),
                axis(at.member("y")),
                layers,
                NodeReader.texts(at, "cautions"));
    }

    private static Axis axis(JsonCursor at) throws InputException {
        at.onlyKeys(AXIS_KEYS);
        return new Axis(
                at.member("label").text(),
                at.member("unit").text(),
                Words.read(at.member("scale"), Axis.Scale.values()));
    }

    private static Layer layer(JsonCursor at) throws InputException {
        at.onlyKeys(LAYER_KEYS);
        double[] x = Numbers.array(at.member("x"));
        return new Layer(
                Words.read(at.member("kind"), Layer.Kind.values()),
                at.member("label").text(),
                x,
                coordinates(at.member("y"), x.length),
                coordinates(at.member("lower"), x.length),
                coordinates(at.member("upper"), x.length));
    }

    private static double[] coordinates(JsonCursor at, int count) throws InputException {
        double[] values = Numbers.array(at);
        if (values.length != count) {
            throw at.problem(
                    "wrong-value",
                    values.length + " coordinates",
                    count + " coordinates, as many as x has",
                    "Correct the layer.");
        }
        return values;
    }
}

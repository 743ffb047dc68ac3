package org.saddlebook.window.internal;

import java.lang.reflect.Proxy;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.barrier.internal.BarrierComponent;
import org.saddlebook.model.arrhenius.internal.Arrhenius;
import org.saddlebook.spontaneity.internal.SpontaneityComponent;
import org.saddlebook.testkit.api.ImmediateTask;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Campaigns for tests, evaluated by the real analyses before the window. */
final class Bench {
    static final double R = Constants.GAS;

    private final List<RateModel> models;

    private Bench(List<RateModel> models) {
        this.models = models;
    }

    static Bench arrhenius() {
        return new Bench(List.of(new Arrhenius()));
    }

    static Bench with(RateModel... models) {
        return new Bench(List.of(models));
    }

    /** An Arrhenius law of first order with a small covariance. */
    static BoundLaw law(double lnA, double ea) {
        try {
            var context = org.saddlebook.api.model.RateContext.of(Units.rateConstant("1/s"), 1);
            var fitted = new org.saddlebook.api.model.FittedModel(
                    "arrhenius",
                    context,
                    List.of("A", "Ea"),
                    new double[] {lnA, ea},
                    new double[][] {{1e-4, 0}, {0, 1}},
                    java.util.OptionalDouble.empty());
            return new BoundLaw(
                    new org.saddlebook.barrier.api.FittedLaws.FittedLawView(
                            "arrhenius", "Arrhenius", fitted, org.saddlebook.barrier.api.NewRun.UNKNOWN, List.of()),
                    new Arrhenius().bind(context),
                    false);
        } catch (UnitException | org.saddlebook.api.model.Inapplicable wrong) {
            throw new IllegalStateException(wrong);
        }
    }

    /** A tree from plain values: numbers, texts, lists, groups. */
    static Node node(Object value) {
        if (value instanceof Node node) {
            return node;
        }
        if (value instanceof Number number) {
            return new Node.Scalar(number.doubleValue());
        }
        if (value instanceof String text) {
            return new Node.Text(text);
        }
        List<Node> items = new ArrayList<>();
        for (Object each : (List<?>) value) {
            items.add(node(each));
        }
        return new Node.Items(items);
    }

    /** A group of alternating keys and values. */
    static Node.Group group(Object... pairs) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (int i = 0; i < pairs.length; i += 2) {
            members.put((String) pairs[i], node(pairs[i + 1]));
        }
        return new Node.Group(members);
    }

    static Node quantity(double value, String unit, double uncertainty) {
        return Node.Quantity.of(value, unit, uncertainty);
    }

    /** Points on an exact line {@code ln k = lnA − Ea/(RT)} with relative errors added to ln k. */
    static Campaign campaign(String unit, double lnA, double ea, double[] kelvin, double[] errors) {
        return campaign(unit, lnA, ea, kelvin, errors, 0);
    }

    /** The same with a stated relative standard uncertainty; 0 for none. */
    static Campaign campaign(String unit, double lnA, double ea, double[] kelvin, double[] errors, double relative) {
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < kelvin.length; i++) {
            double k = StrictMath.exp(lnA - ea / (R * kelvin[i]) + errors[i]);
            RatePoint point = RatePoint.of(kelvin[i], k);
            points.add(relative > 0 ? point.withRateUncertainty(relative * k) : point);
        }
        try {
            var rateUnit = Units.rateConstant(unit);
            return Campaign.titled("invented")
                    .withRateTable(
                            new RateTable(rateUnit, Units.rateOrder(rateUnit).orElseThrow(), points))
                    .withChoices(Choices.defaults()
                            .withErrorModel(relative > 0 ? ErrorModel.STATED : ErrorModel.CONSTANT_RELATIVE));
        } catch (UnitException wrong) {
            throw new IllegalStateException(wrong);
        }
    }

    /** The section window, after the real sections barrier and spontaneity. */
    Section window(Campaign campaign) {
        return window(campaign, ImmediateTask.seeded(5));
    }

    Section window(Campaign campaign, Task task) {
        try {
            return WindowEvaluation.section(campaign, earlier(campaign, task), installed(), task);
        } catch (Cancelled impossible) {
            throw new IllegalStateException(impossible);
        }
    }

    Findings earlier(Campaign campaign, Task task) throws Cancelled {
        Map<String, Section> sections = new LinkedHashMap<>();
        Findings none = new Findings("invented", "", List.of(), Map.of());
        if (campaign.rateTable().isPresent()) {
            // The evaluation folds the installed models into the campaign.
            Campaign effective = campaign.withChoices(
                    campaign.choices().withModels(List.copyOf(installed().keySet())));
            sections.put("barrier", new BarrierComponent(context()).analyse(effective, none, task));
        }
        if (campaign.settings().containsKey("spontaneity")) {
            sections.put("spontaneity", spontaneity(campaign, task));
        }
        return new Findings("invented", "", List.of(), sections);
    }

    private Section spontaneity(Campaign campaign, Task task) throws Cancelled {
        return new SpontaneityComponent(List.of()).analyse(campaign, new Findings("", "", List.of(), Map.of()), task);
    }

    Map<String, InstalledModel> installed() {
        Map<String, InstalledModel> installed = new LinkedHashMap<>();
        for (RateModel model : models) {
            installed.put(model.id(), new InstalledModel(model, "test"));
        }
        return installed;
    }

    /** A context that hands out the models and nothing else. */
    BundleContext context() {
        Bundle bundle = proxy(Bundle.class, (name, arguments) -> "test");
        List<ServiceReference<?>> references = new ArrayList<>();
        for (int i = 0; i < models.size(); i++) {
            int rank = i;
            ServiceReference<?> reference = proxy(ServiceReference.class, (name, arguments) -> switch (name) {
                case "getBundle" -> bundle;
                case "compareTo" -> references.indexOf(arguments[0]) - rank;
                case "hashCode" -> rank;
                default -> null;
            });
            references.add(reference);
        }
        return proxy(BundleContext.class, (name, arguments) -> switch (name) {
            case "getServiceReferences" -> references;
            case "getService" -> models.get(index(references, arguments[0]));
            default -> null;
        });
    }

    private static int index(List<?> list, Object wanted) {
        for (int i = 0; i < list.size(); i++) {
            if (list.get(i) == wanted) {
                return i;
            }
        }
        throw new IllegalArgumentException("unknown reference");
    }

    private interface Answer {
        Object to(String name, Object[] arguments);
    }

    private static <T> T proxy(Class<T> type, Answer answer) {
        return type.cast(Proxy.newProxyInstance(type.getClassLoader(), new Class<?>[] {type}, (self, method, given) -> {
            if (method.getName().equals("equals")) {
                return self == given[0];
            }
            return answer.to(method.getName(), given);
        }));
    }

    // Reading findings.

    static Node at(Node node, Object... path) {
        Node here = node;
        for (Object step : path) {
            here = step instanceof Integer index
                    ? ((Node.Items) here).items().get(index)
                    : ((Node.Group) here).get((String) step).orElseThrow(() -> new AssertionError("no " + step));
        }
        return here;
    }

    static double number(Node node, Object... path) {
        Node leaf = at(node, path);
        return leaf instanceof Node.Quantity quantity ? quantity.value().orElseThrow() : ((Node.Scalar) leaf).value();
    }

    static String text(Node node, Object... path) {
        return ((Node.Text) at(node, path)).value();
    }
}

package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.saddlebook.api.findings.Section;
import org.saddlebook.report.api.ReportPart;

/** The parts that are there, ours and contributed, and what happens when one of them breaks. */
final class Parts {
    private record Known(ReportPart part, String bundle) {}

    private final Map<String, Known> bySection = new LinkedHashMap<>();
    private final List<String> lost = new ArrayList<>();

    /**
     * The parts of one report.
     *
     * @param contributed contributed parts, preferred ones first; they go before ours
     * @param bundleOf symbolic name of the bundle a class comes from
     */
    Parts(List<ReportPart> contributed, Function<Class<?>, String> bundleOf) {
        for (ReportPart part : contributed) {
            String bundle = bundleOf.apply(part.getClass());
            try {
                bySection.putIfAbsent(part.section(), new Known(part, bundle));
            } catch (RuntimeException | LinkageError | StackOverflowError fault) {
                lost.add("The report part " + part.getClass().getName() + " of bundle " + bundle
                        + " could not be used: " + fault(fault) + ".");
            }
        }
        for (ReportPart own : List.of(new BarrierPart(), new SpontaneityPart())) {
            bySection.putIfAbsent(own.section(), new Known(own, "org.saddlebook.report"));
        }
    }

    /** Sentences about parts that could not even say which section they show; empty when there are none. */
    List<String> lost() {
        return List.copyOf(lost);
    }

    /** The section as HTML; never throws. */
    String html(Section section, Tools tools) {
        if (section.outcome() != Section.Outcome.DONE) {
            String why = Trees.text(section.body(), "reason");
            String word = section.outcome() == Section.Outcome.REFUSED ? "Not done: " : "Failed: ";
            return "<p class=\"lost\">" + word + Html.text(why) + "</p>\n";
        }
        Known known = bySection.get(section.id());
        if (known == null) {
            return DefaultPart.html(section, tools);
        }
        String reason;
        try {
            String html = known.part().html(section, tools);
            if (html == null) {
                reason = "it returned nothing";
            } else {
                Optional<String> refused = FragmentCheck.fragment(html);
                if (refused.isEmpty()) {
                    return html;
                }
                reason = "its HTML was refused: " + refused.get();
            }
        } catch (RuntimeException | LinkageError | StackOverflowError fault) {
            reason = fault(fault);
        }
        return "<p class=\"lost\">The report part of bundle " + Html.text(known.bundle())
                + " for this section was lost: " + Html.text(reason) + ". The plain form follows.</p>\n"
                + DefaultPart.html(section, tools);
    }

    /** A fault in words, without a stack. */
    static String fault(Throwable fault) {
        String message = fault.getMessage();
        String name = fault.getClass().getSimpleName();
        return message == null || message.isEmpty() ? name : name + ", " + message;
    }
}

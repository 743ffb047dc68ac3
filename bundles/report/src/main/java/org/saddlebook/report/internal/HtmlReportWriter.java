package org.saddlebook.report.internal;

import java.util.List;
import java.util.Optional;
import org.osgi.framework.Bundle;
import org.osgi.framework.FrameworkUtil;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.report.api.ReportPart;

/** Writes the HTML report with the parts and the renderer that are installed. */
@Component
public final class HtmlReportWriter implements ReportWriter {
    private final List<ReportPart> contributed;
    private final Optional<FigureRenderer> renderer;

    /**
     * A writer.
     *
     * @param contributed contributed parts
     * @param renderers renderers of figures; the first is used, none leaves figures undrawn
     */
    @Activate
    public HtmlReportWriter(
            @Reference(cardinality = ReferenceCardinality.MULTIPLE) List<ReportPart> contributed,
            @Reference(cardinality = ReferenceCardinality.MULTIPLE) List<FigureRenderer> renderers) {
        this.contributed = List.copyOf(contributed);
        this.renderer = renderers.stream().findFirst();
    }

    @Override
    public List<Intake.Part> report(Campaign campaign, Findings findings) {
        return Page.files(campaign, findings, new Parts(contributed, HtmlReportWriter::bundle), renderer);
    }

    private static String bundle(Class<?> contribution) {
        Bundle bundle = FrameworkUtil.getBundle(contribution);
        return bundle == null ? contribution.getName() : bundle.getSymbolicName();
    }
}

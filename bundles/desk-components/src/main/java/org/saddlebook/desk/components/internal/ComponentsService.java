package org.saddlebook.desk.components.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import javax.swing.JComponent;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicy;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawings;
import org.saddlebook.charts.api.FigureFile;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.NodeViews;
import org.saddlebook.desk.components.api.CautionNumbers;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.FigureView;
import org.saddlebook.desk.components.api.NodeTree;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableView;

/** Makes components with the installed figures and formats. */
@Component
public final class ComponentsService implements DeskComponents, NodeViews {
    private final FigureDrawings drawings;
    private final Saving saving;

    @Reference(
            cardinality = ReferenceCardinality.MULTIPLE,
            policy = ReferencePolicy.DYNAMIC,
            policyOption = ReferencePolicyOption.GREEDY)
    private volatile List<FigureFile> files = List.of();

    /** With the system's clipboard and dialogue. */
    @Activate
    public ComponentsService(@Reference FigureDrawings drawings) {
        this(drawings, List.of(), Saving.system());
    }

    /** With these formats, clipboard and dialogue. */
    public ComponentsService(FigureDrawings drawings, List<FigureFile> files, Saving saving) {
        this.drawings = drawings;
        this.saving = saving;
        this.files = files;
    }

    @Override
    public FigureView figure(DeskContext context) {
        List<FigureFile> all = new ArrayList<>(files);
        all.sort(Comparator.comparing(FigureFile::extension));
        return new FigureView(drawings, all, context, saving);
    }

    @Override
    public TableView table(String name, DeskContext context) {
        return new TableView(name, context, saving);
    }

    @Override
    public JComponent tree(String name, Node node, Map<String, String> cautions, DeskContext context) {
        return new NodeTree(name, node, cautions, this, context);
    }

    @Override
    public JComponent figure(Node.Figure figure, Map<String, String> cautions, DeskContext context) {
        FigureView view = figure(context).setHeight(340);
        view.show(figure, cautions);
        return view;
    }

    @Override
    public JComponent table(String name, Node.Table table, DeskContext context) {
        TableView view = table(name, context);
        view.show(TableContent.of(table, new CautionNumbers(List.of())));
        return view;
    }
}

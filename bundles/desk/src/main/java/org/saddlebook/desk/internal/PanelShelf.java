package org.saddlebook.desk.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.function.Supplier;
import javax.swing.SwingUtilities;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;

/**
 * The panels of the campaign in view. Panels are made and told one at a time, each in its own turn of the event thread, so
 * that no turn is long. Event thread only.
 */
final class PanelShelf {
    private final Desk desk;
    private final Supplier<List<Contribution>> installed;
    private final Map<String, DefaultPanelProvider> defaults = new HashMap<>();
    /** Changed on the event thread only; read by the event watch too. */
    private final List<PanelHost> hosts = new CopyOnWriteArrayList<>();

    private Optional<OpenCampaign> shown = Optional.empty();
    private String openId = "barrier";
    private long turn;

    PanelShelf(Desk desk, Supplier<List<Contribution>> installed) {
        this.desk = desk;
        this.installed = installed;
    }

    List<PanelHost> hosts() {
        return List.copyOf(hosts);
    }

    /** The host whose stratum is open: the chosen one, else the first. */
    Optional<PanelHost> open() {
        for (PanelHost host : hosts) {
            if (host.contribution().id().equals(openId)) {
                return Optional.of(host);
            }
        }
        return hosts.isEmpty() ? Optional.empty() : Optional.of(hosts.get(0));
    }

    void openId(String id) {
        openId = id;
    }

    Optional<PanelHost> host(String id) {
        for (PanelHost host : hosts) {
            if (host.contribution().id().equals(id)) {
                return Optional.of(host);
            }
        }
        return Optional.empty();
    }

    /** Shows another campaign, or the same anew. */
    void show(OpenCampaign campaign) {
        clear();
        shown = Optional.of(campaign);
        if (unread(campaign.state())) {
            openId = "measured";
        }
        sync();
    }

    void clear() {
        turn++;
        for (PanelHost host : hosts) {
            host.close();
        }
        hosts.clear();
        shown = Optional.empty();
    }

    static boolean unread(DeskState state) {
        return state.campaign().rateTable().isEmpty()
                && !state.campaign().sources().isEmpty()
                && state.campaign().sources().get(0).reader().isEmpty();
    }

    /** Brings the panels in line with what is installed and with the sections there are. */
    void sync() {
        if (shown.isEmpty()) {
            return;
        }
        OpenCampaign campaign = shown.get();
        List<Contribution> wanted = wanted(campaign.state());
        boolean gone = hosts.removeIf(host -> {
            boolean away = !wanted.contains(host.contribution());
            if (away) {
                host.close();
                release(host, wanted);
            }
            return away;
        });
        long mine = ++turn;
        List<Contribution> missing = new ArrayList<>();
        for (Contribution contribution : wanted) {
            if (host(contribution.id()).isEmpty()) {
                missing.add(contribution);
            }
        }
        if (gone || missing.isEmpty()) {
            desk.view().strataChanged();
        }
        makeNext(campaign, missing, mine);
    }

    /** What a bundle left behind is taken back when its last panel is gone. */
    private static void release(PanelHost host, List<Contribution> wanted) {
        ClassLoader loader = host.contribution().provider().getClass().getClassLoader();
        for (Contribution contribution : wanted) {
            if (contribution.provider().getClass().getClassLoader() == loader) {
                return;
            }
        }
        Release.leftBy(loader);
    }

    private void makeNext(OpenCampaign campaign, List<Contribution> missing, long mine) {
        if (missing.isEmpty()) {
            return;
        }
        SwingUtilities.invokeLater(() -> {
            if (turn == mine) {
                make(campaign, missing.get(0));
                makeNext(campaign, missing.subList(1, missing.size()), mine);
            }
        });
    }

    private void make(OpenCampaign campaign, Contribution contribution) {
        PanelContext context = new PanelContext(contribution.id(), desk, campaign);
        PanelHost host;
        if (desk.settings().setAside().contains(contribution.id())) {
            host = PanelHost.setAside(
                    contribution,
                    context,
                    "The panel " + contribution.id() + " of " + contribution.bundle()
                            + " kept the desk from answering in an earlier run and is set aside.");
        } else {
            host = new PanelHost(contribution, context, () -> desk.view().strataChanged());
            insert(host); // first: should it never come back, the event watch must find it
            host.start(campaign.state());
            told(campaign, host);
            desk.view().strataChanged();
            return;
        }
        insert(host);
        told(campaign, host);
        desk.view().strataChanged();
    }

    private void insert(PanelHost host) {
        int at = 0;
        while (at < hosts.size() && before(hosts.get(at).contribution(), host.contribution())) {
            at++;
        }
        hosts.add(at, host);
    }

    private static boolean before(Contribution a, Contribution b) {
        return a.order() < b.order() || (a.order() == b.order() && a.id().compareTo(b.id()) < 0);
    }

    /** Takes a failed or set aside panel's place for another try. */
    void again(PanelHost host) {
        desk.settings().setAside(host.contribution().id(), false);
        hosts.remove(host);
        host.close();
        sync();
    }

    /** Tells every panel the state, one at a time. */
    void tell(OpenCampaign campaign) {
        if (shown.isEmpty() || shown.get() != campaign) {
            return;
        }
        sync();
        for (PanelHost host : List.copyOf(hosts)) {
            SwingUtilities.invokeLater(() -> {
                if (hosts.contains(host)) {
                    host.show(campaign.state());
                    told(campaign, host);
                    desk.view().strataTold();
                }
            });
        }
    }

    void refresh(String id) {
        host(id).ifPresent(host -> {
            host.refresh();
            shown.ifPresent(campaign -> told(campaign, host));
            desk.view().strataTold();
        });
    }

    private void told(OpenCampaign campaign, PanelHost host) {
        desk.readHairline();
        if (campaign.state().current()
                && campaign.account()
                        .numbers(
                                host.contribution().id(),
                                host.account(),
                                desk.clock().instant())) {
            desk.view().accountChanged();
        }
    }

    private List<Contribution> wanted(DeskState state) {
        List<Contribution> wanted = new ArrayList<>(installed.get());
        Set<String> claimed = new HashSet<>();
        for (Contribution contribution : wanted) {
            claimed.add(contribution.id());
        }
        if (state.findings().isPresent()) {
            for (Section section : state.findings().get().sections().values()) {
                if (!claimed.contains(section.id())) {
                    DefaultPanelProvider provider = defaults.computeIfAbsent(
                            section.id(), id -> new DefaultPanelProvider(id, section.title(), desk.services()));
                    wanted.add(new Contribution(section.id(), provider.order(), "the desk", provider));
                }
            }
        }
        wanted.sort((a, b) -> before(a, b) ? -1 : before(b, a) ? 1 : 0);
        return wanted;
    }

    /** Packages of the panels' classes, to find whose code stands in a stack. */
    List<String> packages() {
        List<String> packages = new ArrayList<>();
        for (PanelHost host : hosts) {
            if (!(host.contribution().provider() instanceof DefaultPanelProvider)) {
                packages.add(host.contribution().packageName());
            }
        }
        return packages;
    }

    /** The hosts of panels with classes in this package. */
    List<PanelHost> ofPackage(String name) {
        List<PanelHost> found = new ArrayList<>();
        for (PanelHost host : hosts) {
            DeskPanelProvider provider = host.contribution().provider();
            if (provider.getClass().getPackageName().equals(name)) {
                found.add(host);
            }
        }
        return found;
    }
}

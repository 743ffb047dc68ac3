package org.saddlebook.desk.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Reading;

/** Has the hairline read by the panels in the background, the newest position only. Event thread only. */
final class HairlineReader {
    private final Desk desk;
    private boolean reading;
    private boolean again;

    HairlineReader(Desk desk) {
        this.desk = desk;
    }

    /** The hairline moved, or what lies under it changed. */
    void moved() {
        OptionalDouble at = desk.rail().hairline();
        Optional<OpenCampaign> campaign = desk.current();
        if (at.isEmpty() || campaign.isEmpty()) {
            return;
        }
        for (PanelHost host : desk.shelf().hosts()) {
            host.context().hairlineMoved(at.getAsDouble());
        }
        if (reading) {
            again = true;
            return;
        }
        reading = true;
        double kelvin = at.getAsDouble();
        DeskState state = campaign.get().state();
        List<PanelHost> hosts = desk.shelf().hosts();
        desk.background()
                .run(
                        "reading the hairline",
                        false,
                        progress -> {
                            List<Reading> all = new ArrayList<>();
                            for (PanelHost host : hosts) {
                                all.addAll(host.read(state, kelvin));
                            }
                            return all;
                        },
                        readings -> {
                            ended();
                            desk.readings(kelvin, readings);
                        },
                        fault -> ended());
    }

    private void ended() {
        reading = false;
        if (again) {
            again = false;
            moved();
        }
    }
}

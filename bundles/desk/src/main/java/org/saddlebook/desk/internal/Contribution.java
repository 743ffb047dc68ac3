package org.saddlebook.desk.internal;

import org.saddlebook.desk.api.DeskPanelProvider;

/**
 * A provider of panels and where it comes from.
 *
 * @param id id of the provider, asked once
 * @param order place, asked once
 * @param bundle symbolic name and version of its bundle, for people
 * @param provider the provider
 */
record Contribution(String id, int order, String bundle, DeskPanelProvider provider) {
    /** The package of the provider's class: stack frames in it are the panel's. */
    String packageName() {
        return provider.getClass().getPackageName();
    }
}

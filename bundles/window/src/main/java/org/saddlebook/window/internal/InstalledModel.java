package org.saddlebook.window.internal;

import org.saddlebook.api.model.RateModel;

/**
 * A rate model that is installed.
 *
 * @param model the model
 * @param bundle symbolic name of the bundle it comes from
 */
record InstalledModel(RateModel model, String bundle) {
    /** The model by name, for messages. */
    String culprit() {
        return "model " + model.id() + " of bundle " + bundle;
    }
}

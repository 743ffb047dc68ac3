package org.saddlebook.api.campaign;

/** How the errors of the rate constants behave; {@code key} is the word used in files. */
public enum ErrorModel {
    /** Constant relative error of unknown size: least squares on ln k, scale estimated from the scatter. */
    CONSTANT_RELATIVE("constant-relative"),
    /** Stated standard uncertainties of k: weights (k/u)^2 on ln k, never rescaled. */
    STATED("stated"),
    /** Stated standard uncertainties of k and of T: weighted orthogonal distance, never rescaled. */
    STATED_BOTH("stated-both"),
    /** Constant absolute error of unknown size: least squares on k itself, scale estimated from the scatter. */
    CONSTANT_ABSOLUTE("constant-absolute");

    private final String key;

    ErrorModel(String key) {
        this.key = key;
    }

    /** The word used in files. */
    public String key() {
        return key;
    }

    /** Whether the sizes of the errors are stated, so that nothing is estimated from the scatter. */
    public boolean isStated() {
        return this == STATED || this == STATED_BOTH;
    }

    /** The error model with this word; throws {@link IllegalArgumentException} for an unknown one. */
    public static ErrorModel of(String key) {
        for (ErrorModel model : values()) {
            if (model.key.equals(key)) {
                return model;
            }
        }
        throw new IllegalArgumentException("unknown error model: " + key);
    }
}

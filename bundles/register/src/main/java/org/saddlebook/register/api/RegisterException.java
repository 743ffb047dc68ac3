package org.saddlebook.register.api;

import java.io.IOException;

/** The register cannot do what was asked; the message is a sentence for the user. */
public class RegisterException extends IOException {
    private static final long serialVersionUID = 1L;

    /** A reason in words. */
    public RegisterException(String message) {
        super(message);
    }

    /** A reason in words and what lay behind it. */
    public RegisterException(String message, Throwable cause) {
        super(message, cause);
    }
}

package org.saddlebook.register.api;

/** What is stored cannot be read as what it must be: something or somebody changed it outside the register. */
public final class RegisterDamagedException extends RegisterException {
    private static final long serialVersionUID = 1L;

    /** What is damaged, in words. */
    public RegisterDamagedException(String message) {
        super(message);
    }

    /** What is damaged, in words, and what lay behind it. */
    public RegisterDamagedException(String message, Throwable cause) {
        super(message, cause);
    }
}

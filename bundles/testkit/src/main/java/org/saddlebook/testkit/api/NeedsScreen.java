package org.saddlebook.testkit.api;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.extension.ExtendWith;

/**
 * The test opens real windows. Where the environment names no screen, a virtual one (the program {@code Xvfb}) is started
 * for it; where there is no such program either, the test is skipped and the reason is printed, except when the variable
 * {@code SADDLEBOOK_NEEDS_SCREEN} is set: then it fails.
 *
 * <p>The process must run with the variable {@code DISPLAY}, and where that is to be made, with {@code SADDLEBOOK_XVFB} of
 * the same value: a running Java process cannot change its environment.
 */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@Tag("window")
@ExtendWith(ScreenCondition.class)
public @interface NeedsScreen {}

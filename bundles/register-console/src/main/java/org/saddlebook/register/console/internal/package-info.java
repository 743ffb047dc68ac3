/**
 * The verbs {@code enter}, {@code register} and {@code review}: they join evaluation, report and register through the
 * interfaces of {@code org.saddlebook.api.service}, and nothing here loads one of them before it is needed.
 */
package org.saddlebook.register.console.internal;

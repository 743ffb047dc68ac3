/** The analysis {@code window}; exports nothing. */
package org.saddlebook.window.internal;

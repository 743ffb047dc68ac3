/** The rules of the section {@code dataChecks}, one small class each, and what they share. */
package org.saddlebook.data.checks.internal;

/** Comparison of several reactions, of ratios against temperature, and with literature; the verb {@code compare}. */
package org.saddlebook.reaction.series.internal;

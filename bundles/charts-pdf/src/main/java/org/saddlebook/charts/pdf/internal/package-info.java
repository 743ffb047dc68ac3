/** Figures as PDF. */
package org.saddlebook.charts.pdf.internal;

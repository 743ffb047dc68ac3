/**
 * Reads delimited text: bytes to text ({@code TextDecoder}), text to lines and directives ({@code TextDocument}), lines
 * to cells ({@code Separator}, {@code SeparatorChoice}), headings to columns with units ({@code HeadingParser}, {@code
 * ColumnPlan}) and cells to rate points ({@code PointReader}). Every problem is collected; the codes are listed in the
 * bundle's README.md and are stable.
 */
package org.saddlebook.reader.text.internal;

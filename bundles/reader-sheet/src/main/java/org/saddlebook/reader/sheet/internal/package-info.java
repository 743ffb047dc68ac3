/** Spreadsheets to delimited rows, which the reader of delimited text then understands. */
package org.saddlebook.reader.sheet.internal;

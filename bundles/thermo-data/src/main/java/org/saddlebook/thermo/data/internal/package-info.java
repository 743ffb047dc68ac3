/** The curated set and the readers of published forms. */
package org.saddlebook.thermo.data.internal;

/** Fits the installed rate models to a rate table and says what follows. */
package org.saddlebook.barrier.internal;

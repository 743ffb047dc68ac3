/** The grammar of formulas and equations, and their balance. */
package org.saddlebook.reaction.internal;

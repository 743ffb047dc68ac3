/** Orders and runs the installed analyses. */
package org.saddlebook.evaluation.internal;

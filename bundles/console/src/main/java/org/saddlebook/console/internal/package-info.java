/** The command line: finds the verb, runs it, turns what went wrong into messages and exit codes. */
package org.saddlebook.console.internal;

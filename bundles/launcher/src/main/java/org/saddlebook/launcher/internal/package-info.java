/** Starts the framework, reads the features, applies the administrator's policy and calls the console. */
package org.saddlebook.launcher.internal;

/** The panel of this bundle. */
package org.saddlebook.desk.window.internal;

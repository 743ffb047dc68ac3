/** The panel of this bundle. */
package org.saddlebook.desk.measured.internal;

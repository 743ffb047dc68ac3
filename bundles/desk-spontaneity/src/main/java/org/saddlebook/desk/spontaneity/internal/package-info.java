/** The panel of this bundle. */
package org.saddlebook.desk.spontaneity.internal;

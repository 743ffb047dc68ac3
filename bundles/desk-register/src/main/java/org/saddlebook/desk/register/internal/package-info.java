/** The panel of this bundle. */
package org.saddlebook.desk.register.internal;

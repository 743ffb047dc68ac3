/** The panel of this bundle. */
package org.saddlebook.desk.barrier.internal;

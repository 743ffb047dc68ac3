/** The shell; nothing here is for others. */
package org.saddlebook.desk.internal;

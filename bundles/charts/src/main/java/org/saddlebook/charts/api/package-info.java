/**
 * Figures for windows and files: lays a neutral figure out for a size, a theme and a part of its axes, paints it on any
 * Graphics2D, and says what lies under a pixel. Start with {@link org.saddlebook.charts.api.FigureDrawings}, a service;
 * implement {@link org.saddlebook.charts.api.FigureFile} to save figures in one more format. Whoever imports this package
 * loads AWT; headless bundles use {@code org.saddlebook.api.service.FigureRenderer} instead.
 */
@Export
@Version("1.0.0")
package org.saddlebook.charts.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;

package org.evenbeam.planted.ui.sheet;

import javafx.scene.control.Label;
import org.evenbeam.planted.app.Edge;

/** A view model that knows the toolkit and looks up. */
public final class SheetViewModel {
  final Edge edge = new Edge();
  Label label;
}

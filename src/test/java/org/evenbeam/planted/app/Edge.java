package org.evenbeam.planted.app;

/** What nobody below may see. */
public final class Edge {}

package perveance.desktop.viewmodel;

import java.util.concurrent.Executor;

/**
 * Where things run.
 *
 * @param quick answers without bands
 * @param thorough answers with bands
 * @param foreground where answers arrive: the thread of the window
 */
public record Desks(Executor quick, Executor thorough, Executor foreground) {}

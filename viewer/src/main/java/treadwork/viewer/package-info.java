/** The packaged program; the window will live here. Uses all modules. */
package treadwork.viewer;

// The typefaces ship with the program; no page asks another host for one.
import "@fontsource-variable/instrument-sans";
import "@fontsource-variable/newsreader";
import "@fontsource-variable/spline-sans-mono";

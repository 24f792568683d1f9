// The typefaces ship with the program; no page asks another host for one. Newsreader comes with its optical sizes.
import "@fontsource-variable/instrument-sans";
import "@fontsource-variable/newsreader/opsz.css";
import "@fontsource-variable/spline-sans-mono";

/** Stands in for the marker package, which only a React server bundle may load. */
export {};

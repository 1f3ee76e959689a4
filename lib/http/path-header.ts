/** Set by the proxy on every page request: a server component is not told its own address otherwise. */
export const PATH_HEADER = "x-neaptide-path";

/** Node's flags for the server. */
export const serverFlags: readonly string[];

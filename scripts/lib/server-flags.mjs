/**
 * Node's flags for the server. The heap grows in small steps: an as-built of 50,000 lines peaks 35 MiB above one of 1,000
 * instead of 93, for about a seventh more time in that job (`npm run bench:transmittal`). Heavy checks run in children of
 * their own with flags of their own.
 */
export const serverFlags = ['--optimize-for-size'];

/** A taken batch that nobody decides anything on for so many days goes back to the queue. The owner's habit; a demo value. */
export const IDLE_REVIEW_DAYS = 3;

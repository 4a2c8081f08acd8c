/** A reading with its unit is short; the remark on an item of a function check is a sentence or two. Characters. */
export const longestReading = 60;
export const longestRemark = 300;

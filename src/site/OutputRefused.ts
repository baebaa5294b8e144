/** The site cannot be written where it was asked for, said in words for the person who named the place. */
export class OutputRefused extends Error {}

/** Gives other work of the same process its turn between two pieces of a long file. */
export const letOthersRun = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

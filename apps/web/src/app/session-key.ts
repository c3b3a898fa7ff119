export const sessionKey = ['session'] as const;

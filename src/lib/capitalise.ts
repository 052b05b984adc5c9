export const capitalise = (text: string): string => `${text[0]?.toUpperCase() ?? ''}${text.slice(1)}`

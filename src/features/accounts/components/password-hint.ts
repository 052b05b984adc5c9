export const passwordHint = 'At least 15 characters. A few words in a row do well; spaces and any signs are fine.'

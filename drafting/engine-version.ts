/** Stands in every draft and every saved version. Raise it whenever the same order may be drawn differently. */
export const engineVersion = '1.0.0'

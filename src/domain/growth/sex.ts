/** The two sexes for which growth references are published. */
export type Sex = 'male' | 'female';

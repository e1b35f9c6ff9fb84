/** Phone numbers kept for fiction: (212) 555-0100 to -0199, in E.164. */
export const fictionPhone = (number: number): string =>
  `+1212555${String(100 + (number % 100)).padStart(4, '0')}`;

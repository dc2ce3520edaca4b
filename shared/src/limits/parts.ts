/** How much a part's record takes: characters, and entries. */
export const partLimit = {
  parameterName: 60,
  parameterValue: 60,
  parameterUnit: 20,
  parameters: 60,
  suppliers: 20,
} as const;

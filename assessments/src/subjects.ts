/** The twelve subjects of the question bank, by the code a sheet carries. */
export const SUBJECTS: Record<string, string> = {
  CL: 'circuit laws and power',
  SI: 'safe isolation',
  CO: 'conductors',
  VD: 'voltage drop',
  RD: 'rating and derating',
  PR: 'protection',
  TE: 'terminations',
  BA: 'batteries',
  CC: 'charge stages and curves',
  DA: 'DC-DC charging and alternators',
  SO: 'solar',
  MF: 'metering and fault reasoning',
};

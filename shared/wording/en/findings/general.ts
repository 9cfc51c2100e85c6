export const general = {
  'finding.lacks': 'Nobody can say: {field} is not stated.',
  'finding.data.missing': '{field} is not stated. These checks wait for it: {rules}.',
} as const;

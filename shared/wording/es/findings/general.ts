export const general = {
  'finding.lacks': 'Nadie lo puede decir: falta {field}.',
  'finding.data.missing': 'Falta {field}. Estas comprobaciones lo esperan: {rules}.',
} as const;

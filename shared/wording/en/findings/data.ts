export const data = {
  'finding.data.duplicate-address.title': 'Address used twice',
  'finding.data.duplicate-address': 'Address {value} stands in more than one row: {points}.',
  'finding.data.duplicate-terminal.title': 'Terminal used twice',
  'finding.data.duplicate-terminal': 'Points {points} are all on terminal {value}.',
  'finding.data.duplicate-wire.title': 'Wire number used twice',
  'finding.data.duplicate-wire': 'Points {points} all have wire number {value}.',
  'finding.data.unused-terminal.title': 'Terminal not in the list',
  'finding.data.unused-terminal':
    'No row names these terminals of {module}: {terminals}. Is something on them?',
  'finding.data.spare-connected.title': 'Spare point is wired',
  'finding.data.spare-connected': 'Terminal {terminal} is called spare, yet something is wired to it.',
} as const;

export const mail = {
  'mail.foot':
    'Coldloop helps qualified people follow and record a procedure. It does not replace your site rules, local codes or licensed judgement.',
  'mail.invitation.subject': 'You are invited to Coldloop',
  'mail.invitation.body':
    'Hello {name}.\n{by} has added you to Coldloop. Set your password with the link below. It works once, for 7 days.',
  'mail.invitation.action': 'Set your password',
  'mail.password-reset.subject': 'Set a new password',
  'mail.password-reset.body':
    'Hello {name}.\nSomebody asked for a new password for this address. If it was you, use the link below. It works once, for one hour. If not, do nothing: your password stays.',
  'mail.password-reset.action': 'Set a new password',
  'mail.job-given.subject': 'Job {number} on panel {panel} is yours',
  'mail.job-given.body':
    'Hello {name}.\n{by} has given you job {number} on panel {panel}, due {due}. Open it once with signal, so that it is on your phone in the basement.',
  'mail.job-given.action': 'Open the job',
  'mail.countersign-wanted.subject': 'Job {number} on panel {panel} waits for you',
  'mail.countersign-wanted.body':
    'Hello {name}.\nJob {number} on panel {panel} is signed. Read it, then countersign or return it.',
  'mail.countersign-wanted.action': 'Read the job',
  'mail.job-returned.subject': 'Job {number} on panel {panel} came back',
  'mail.job-returned.body':
    'Hello {name}.\n{by} returned job {number} on panel {panel}. The steps to do again are open on your phone.',
  'mail.job-returned.action': 'Open the job',
  'mail.record-sealed.subject': 'Record {number}: panel {panel} is sealed',
  'mail.record-sealed.body':
    'Hello {name}.\nJob {job} on panel {panel} is signed, countersigned and sealed as record {number}.\nSeal: {seal}\nKeep this mail: it proves the record outside the database.',
  'mail.record-sealed.action': 'Open the record',
  'mail.record-amended.subject': 'Amendment {number}: panel {panel}, job {job}',
  'mail.record-amended.body':
    'Hello {name}.\nEntries for job {job} on panel {panel} arrived after its record was sealed. They are sealed as amendment {number}. Read what changed: it may concern a lock, a hold or a reading out of limits.\nSeal: {seal}\nKeep this mail: it proves the record outside the database.',
  'mail.record-amended.action': 'Read the amendment',
  'mail.key-registered.subject': 'Your signing key was set up on a device',
  'mail.key-registered.body':
    'Hello {name}.\nA signing key in your name was set up on the device "{device}". If that was not you, tell your administrator now.',
  'mail.key-registered.action': 'Open this device',
} as const;

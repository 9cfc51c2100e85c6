export const problems = {
  'problem.invalid': 'Some of what was sent cannot be used. Nothing was changed. See each place below.',
  'problem.not-found': 'This does not exist, or it is not on one of your sites.',
  'problem.forbidden': 'Your roles do not allow this. Nothing was changed.',
  'problem.sign-in-needed': 'Sign in to go on. Answers on this device stay here until then.',
  'problem.wrong-sign-in': 'E-mail or password is wrong. Try again, or ask for a new password.',
  'problem.too-many-tries': 'Too many wrong tries. Wait {minutes} minutes, then try again.',
  'problem.cross-site':
    'This request came from another page, so it was refused. Nothing was changed. Open Coldloop itself and try again.',
  'problem.too-large': 'This is too large. Nothing was changed. Send a smaller file.',
  'problem.unreadable':
    'This could not be read. Nothing was changed. Check that it is the right file and that it is whole.',
  'problem.stale':
    'Somebody else changed this meanwhile. Nothing was overwritten. Load it again, then make your change.',
  'problem.email-taken': 'A person with this e-mail address exists already. Nothing was changed.',
  'problem.name-taken': 'This name is taken already. Choose another one.',
  'problem.not-yourself': 'You cannot take this away from yourself. Ask another administrator.',
  'problem.token-ended': 'This link was used or is too old. Ask for a new one.',
  'problem.not-ready':
    'The server cannot reach its database just now. Nothing was lost. Try again in a few seconds.',
  'problem.fault':
    'Something went wrong on the server. Nothing of this request was kept. Try again; if it stays, tell your administrator.',
  'problem.id-taken':
    'Something else carries this id already. Nothing was changed. Start again with a new one.',
  'problem.tag-taken':
    'A panel with this tag exists on this site already. Nothing was changed. Open that one, or change the tag.',
  'problem.not-issuable': 'This draft cannot be issued yet. Nothing was changed. Mend each place below.',
  'problem.findings-stand':
    'Findings stand that nobody has accepted. Nothing was changed. Mend them, or accept each with a reason.',
  'problem.job-blocked': 'No job may start on these points. Nothing was changed. See each reason below.',
  'problem.not-fit': 'These people cannot do this job. Nothing was changed. See each reason below.',
  'problem.not-planned': 'This job was sent already, or it has ended. Nothing was changed. Load it again.',
  'problem.ended': 'This job has ended. Nothing was changed.',
  'problem.locks-on':
    'A lock of this job is still on, or not known. Nothing was changed. Take the locks off first.',
  'problem.busy': 'The server has much to do just now. Nothing was lost. Try again in a few seconds.',
  'problem.heads':
    'The server lacks what comes before these entries. Nothing was lost. This device sends from there.',
  'problem.unknown-key':
    'The server does not know the key of these entries. They stay on this device. Sign in on it again.',
  'problem.unknown-pack':
    'These entries name a checklist that was never given out for this job. They stay on this device.',
  'problem.bad-signature': 'A signature does not fit its entry. The entry stays on this device.',
  'problem.broken-log': 'These entries do not follow one another. They stay on this device.',
  'problem.device-revoked':
    'This device was shut out by an administrator. Ask them before you work with it again.',
  'reason.no-points': 'No point is chosen.',
  'reason.unknown-point': 'Point {point} is not in this revision.',
  'reason.not-accepted': 'Accept this with a reason, or mend it.',
  'reason.nothing-to-accept': 'No finding of this rule stands there.',
  'reason.same-person': 'A foreman who also works cannot countersign. Choose somebody else.',
  'reason.no-electrician': 'This person is not an electrician of this site.',
  'reason.no-foreman': 'This person is not a foreman of this site.',
} as const;

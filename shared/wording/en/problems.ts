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
} as const;

export const conductors = {
  'finding.wire.colour.title': 'Conductor colour',
  'finding.wire.colour.protective':
    'Wire {wire} at {terminal} is green-and-yellow and live. That colour is for the earth conductor only.',
  'finding.wire.colour.cable':
    'Cable {wire} at {terminal} has too few cores: a live conductor would take the green-and-yellow one.',
  'finding.wire.colour.other': 'Wire {wire} is {colour}. {practice} asks for {expected}.',
  'remedy.wire.colour.protective': 'Use another core or another cable.',
  'remedy.wire.colour.other': 'Change the wire, or mark it where it is landed.',

  'finding.wire.too-small.title': 'Conductor too small',
  'finding.wire.too-small': 'The load draws {A} A. The conductor carries {carriesA} A.',
  'remedy.wire.too-small': 'Use a conductor for {A} A.',

  'finding.fuse.too-big.title': 'Fuse too big',
  'finding.fuse.too-big.wire': 'Fuse {fuse} has {A} A. The wire behind it carries {limitA} A.',
  'finding.fuse.too-big.output': 'Fuse {fuse} has {A} A. The output behind it carries {limitA} A.',
  'finding.fuse.too-big.group': 'Fuse {fuse} has {A} A. The common behind it carries {limitA} A.',
  'remedy.fuse.too-big': 'Fit {maxA} A or less.',
  'remedy.fuse.too-big.none': 'No standard fuse is small enough: use a thicker wire.',

  'finding.fuse.missing.title': 'Fuse missing',
  'finding.fuse.missing.semiconductor':
    'Nothing opens when the output at {terminal} meets the other pole of {supply}.',
  'finding.fuse.missing.other-supply':
    '{supply} reaches {terminal} as well, and nothing in series with it opens.',
  'finding.fuse.missing.relay-load':
    'Nothing protects the load on {supply} that the relay at {terminal} switches.',
  'remedy.fuse.missing':
    'Fit a fuse of {fitA} A in series with the point. It may still not save a transistor.',
  'remedy.fuse.missing.any': 'Fit a fuse in series with the point. It may still not save a transistor.',

  'finding.fuse.too-small.title': 'Fuse too small',
  'finding.fuse.too-small.load': 'Fuse {fuse} has {A} A. Loads that stay on need {needsA} A.',
  'finding.fuse.too-small.quick':
    'Fuse {fuse} is a quick one of {A} A. Switching on draws more than {needsA} A.',
  'finding.fuse.too-small.selectivity':
    'Fuse {fuse} has {A} A. It opens with the one behind it; it should have {needsA} A.',
  'remedy.fuse.too-small.load': 'Fit {minA} A, if wire and output stand it.',
  'remedy.fuse.too-small.quick': 'Fit a time-lag fuse of {minA} A.',
  'remedy.fuse.too-small.selectivity': 'Fit {minA} A before it, if wire and common stand it.',

  'finding.wire.drop.title': 'Cable keeps too much voltage',
  'finding.wire.drop': 'The cable of {m} m keeps {V} V at {A} A. {limitV} V are allowed.',
  'remedy.wire.drop': 'Use a thicker cable, or at most {m} m of this one.',

  'finding.wire.size-terminal.title': 'Conductor does not fit the terminal',
  'finding.wire.size-terminal.thin':
    'Terminal {terminal} holds {minMm2} to {maxMm2} mm². The conductor has {mm2} mm² and can slip out.',
  'finding.wire.size-terminal.thick':
    'Terminal {terminal} holds {minMm2} to {maxMm2} mm². The conductor has {mm2} mm² and does not go in.',
  'remedy.wire.size-terminal': 'Use a conductor that the terminal holds, or a terminal between.',

  'finding.wire.screen.title': 'Screen',
  'finding.wire.screen.none': 'The screen of {cable} is earthed nowhere. It stops no noise.',
  'finding.wire.screen.both': 'The screen of {cable} is earthed at both ends. Earth currents run through it.',
  'remedy.wire.screen': 'Earth it at one end, as a rule at the panel. Insulate and fold back the other.',
} as const;

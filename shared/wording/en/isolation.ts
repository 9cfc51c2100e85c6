export const isolation = {
  'isolation.none':
    'No safe isolation exists: with everything open, {place} is still live ({path}){places, plural, =0 {} one {} other {, one of # places}}.',
  'isolation.no-feed': 'Nobody has said what feeds {supply}. It counts as always live.',
  'isolation.derived-loop': '{supplies} feed each other and no source feeds them. They count as always live.',
  'isolation.one-pole':
    '{isolator} opens one conductor only and is the only means for {supply}. The other conductor can stay live.',
  'isolation.control-device-as-isolator':
    '{isolator} is a control device, or not made for isolation, and is the only means for {supply}.',
  'isolation.other-energy': '{source} ({description}) has no isolator that holds it back.',
  'isolation.single-point-cannot-lock':
    '{isolator} ({location}) cannot be locked. It needs a tag and one more measure.',
  'isolation.foreign-voltage': '{supply} reaches terminal {terminal} from another circuit.',
  'isolation.foreign-voltage.stays.iec':
    '{supply} reaches terminal {terminal} and stays live with the disconnect open. Its wires should be orange (IEC 60204-1).',
  'isolation.foreign-voltage.stays.nfpa':
    '{supply} reaches terminal {terminal} and stays live with the disconnect open. Its wires should be yellow or orange (NFPA 79).',
  'isolation.stored-unknown': '{supply} stores charge and nobody knows how long it lasts. Measure it.',
  'isolation.redundant-feed': '{supply} has {feeds} feeds. It is dead only when all of them are open.',
  'isolation.ups': '{source} ({location}) is a battery. It feeds with the mains off.',
  'isolation.not-in-sight': '{isolator} ({location}) cannot be seen from the panel.',
  'isolation.no-load-break':
    '{isolator} ({location}) must not break load. Open it only when its current reads 0.',
  'isolation.same-tag-differs':
    'Panel {panel} describes {isolator} differently. Check that it is one device.',
  'isolation.remedy.none':
    'Add a lockable isolator to that path, or state the missing facts in the panel file.',
  'isolation.remedy.no-feed': 'Name the source or supply that feeds {supply}, and the isolators between.',
  'isolation.remedy.derived-loop': 'Name the source that feeds one of them.',
  'isolation.remedy.one-pole': 'Put a device that opens all live conductors before {isolator}.',
  'isolation.remedy.control-device-as-isolator':
    'Put a disconnect or breaker made for isolation before {isolator}.',
  'isolation.remedy.other-energy': 'Name the valve, block or pin that holds {source} back.',
  'isolation.quantity.volts': 'Voltage',
  'isolation.quantity.capacitance': 'Stored charge, capacitance',
  'isolation.quantity.feeds': 'Feeds',
  'isolation.incoming': 'incoming terminals of {isolator}',
} as const;

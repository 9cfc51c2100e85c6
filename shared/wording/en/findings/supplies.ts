export const supplies = {
  'finding.supply.missing.title': 'Common without a supply',
  'finding.supply.missing': 'Nobody has said which supply feeds common {common} ({field}).',
  'finding.supply.missing.unknown': 'Common {common} names supply {supply}, which this panel does not have.',
  'finding.supply.logic-feeds-field.title': 'Logic supply feeds field wiring',
  'finding.supply.logic-feeds-field':
    'Common {common} is fed by {supply}, the supply of the controller itself. A fault in the field stops the controller.',
  'finding.supply.logic-feeds-field.remedy': 'Feed this common from a field supply.',
  'finding.supply.kind.title': 'AC on DC, or DC on AC',
  'finding.supply.kind': '{supply} gives {fed}; module {module} is not made for it.',
  'finding.supply.kind.pole': 'Common {common} is said to be {pole}, but {supply} gives {fed}.',
  'finding.supply.kind.remedy': 'Use a supply or a module of the other kind.',
  'finding.supply.level-high.title': 'Supply too high',
  'finding.supply.level-high': '{supply} can reach {V} V. Module {module} stands {most} V.',
  'finding.supply.level-high.remedy': 'Keep the supply at {V} V or less, or state what the module stands.',
  'finding.supply.level-low.title': 'Supply too low',
  'finding.supply.level-low': '{supply} can fall to {V} V. Module {module} needs {least} V.',
  'finding.supply.level-low.remedy': 'Keep the supply at {V} V or more.',
  'finding.supply.no-tolerance.title': 'Limits of the supply not stated',
  'finding.supply.no-tolerance': 'Nobody has said how far {supply} can rise and fall ({field}).',
  'finding.supply.overload.title': 'Supply overloaded',
  'finding.supply.overload': 'With everything on, {supply} must give {A} A. It is rated {ratedA} A.',
  'finding.supply.overload.remedy': 'Use a supply for {A} A or more, or move loads.',
  'finding.supply.two-on-one-common.title': 'Two supplies on one common',
  'finding.supply.two-on-one-common':
    'Groups {groups} share terminal {common} but name different supplies ({supplies}). With one off, the other keeps it live.',
  'finding.supply.two-on-one-common.poles':
    'Groups {groups} share terminal {common} but put different poles of {supplies} on it. That is a short circuit.',
  'finding.supply.two-on-one-common.remedy': 'Give each supply a common of its own.',
  'finding.supply.commons-bridged.title': 'Commons of two supplies bridged',
  'finding.supply.commons-bridged':
    'Commons {groups} are bridged but hang on different supplies ({supplies}). With one off, the other keeps them live.',
  'finding.supply.commons-bridged.poles':
    'Commons {groups} are bridged but stand on different poles of {supplies}. That is a short circuit.',
  'finding.supply.commons-bridged.remedy': 'Take the bridge out, or feed all bridged commons alike.',
  'finding.supply.mixed-bands.title': 'Extra-low and low voltage together',
  'finding.supply.mixed-bands.terminals':
    '{low} and {high} ({V} V) stand side by side at {place}. The module is insulated for {insulationV} V only.',
  'finding.supply.mixed-bands.terminals.remedy': 'Use a module insulated for {V} V, or keep the two apart.',
  'finding.supply.mixed-bands.cable':
    '{low} and {high} ({V} V) run in one cable, {place}. It is insulated for {insulationV} V only.',
  'finding.supply.mixed-bands.cable.remedy': 'Use a cable insulated for {V} V, or two cables.',
  'finding.supply.unearthed-control.title': 'Control supply without earth or monitor',
  'finding.supply.unearthed-control':
    '{supply} is not earthed and no monitor watches it. Its first earth fault goes unseen, its second can start something.',
  'finding.supply.unearthed-control.remedy': 'Earth one pole, or fit an insulation monitor.',
  'finding.group.fuse-missing.title': 'Output group without a fuse',
  'finding.group.fuse-missing':
    'No fuse is stated between {supply} and the outputs of group {group}. A short circuit burns the wires.',
  'finding.group.fuse-missing.remedy': 'Fit a fuse before the common, or state the protection of the supply.',
  'finding.group.fuse-missing.remedy.most':
    'Fit a fuse of {A} A or less before the common, or state the protection of the supply.',
} as const;

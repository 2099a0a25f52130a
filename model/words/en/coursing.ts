/** What an answer of the coursing costs: what it misses, what it rips, and its joints. */
export const coursing = {
  /** A height by the thing that wants it. */
  height: {
    sill: 'the sill of {{thing}}',
    head: 'the head of {{thing}}',
    bondBeam: 'the soffit of {{thing}}',
    other: '{{thing}}',
  },
  /** Of a course line and the height that it was to meet. */
  miss: {
    hardAbove: 'The course line lies {{amount}} above {{height}}, which is held hard.',
    hardBelow: 'The course line lies {{amount}} below {{height}}, which is held hard.',
    pastAbove: 'The course line lies {{amount}} above {{height}}, more than its tolerance.',
    pastBelow: 'The course line lies {{amount}} below {{height}}, more than its tolerance.',
    withinAbove: 'The course line lies {{amount}} above {{height}}, within its tolerance.',
    withinBelow: 'The course line lies {{amount}} below {{height}}, within its tolerance.',
  },
  everyHeightMet: 'Every height is met.',
  thinner: 'Course {{course}} is a thinner one: its units are {{size}} high.',
  nominalJoints: 'Every bed joint is {{joint}}, the nominal one.',
  evenJoints: 'Every bed joint is {{joint}}, {{step}} from the nominal one.',
  joints: 'Bed joints of {{thinnest}} to {{thickest}}, at most {{step}} from the nominal one.',
  hair: 'less than {{step}}',
  proof: {
    heights:
      'The search stopped at its limit: these heights are the best there are, but the joints may not be the most even.',
    held: 'The search stopped at its limit: the lightest heights were left out of it and take the course line nearest to them.',
    none: 'No count of courses fits: courses of the nominal joint pass every height.',
  },
} as const;

export const common = {
  product: 'Polewright',
  tagline: 'Story poles, courses and set-out for masonry walls',
  loading: 'Loading',
  failed: 'This could not be fetched',
  tryAgain: 'Try again',
  noPermission: 'Your role does not reach this',
  offline: 'No signal. What you enter is kept on this device and sent when there is signal again.',
  close: 'Close',
  back: 'Back',
  cancel: 'Cancel',
  no: 'No',
  none: 'None',

  nav: {
    label: 'Parts of the site',
    plan: 'Plan',
    walls: 'Walls',
    poles: 'Poles',
    levels: 'Levels',
    takeoff: 'Takeoff',
    revisions: 'Revisions',
    crew: 'Crew',
    more: 'More',
    sites: 'Sites',
    allSites: 'All sites',
  },

  theme: {
    label: 'Screen colours',
    light: 'Paper',
    sun: 'Bright sun',
  },

  units: {
    imperial: 'Feet and inches',
    metric: 'Millimetres',
  },

  roles: {
    lead: 'Lead',
    designer: 'Designer',
    mason: 'Mason',
    observer: 'Observer',
  },

  roleTells: {
    lead: 'Answers for the site: surveys, saves revisions, looks after the crew',
    designer: 'Draws, reads levels and saves revisions',
    mason: 'Reads the marks and logs levels',
    observer: 'Reads everything and changes nothing',
  },

  errors: {
    offline: 'The server could not be reached. Check the signal and try again.',
    badInput: 'Something in what was sent could not be read.',
    tooLarge: 'That is too large to send.',
    signedOut: 'You have been signed out. Sign in again to go on.',
    notAllowed: 'Your role on this site does not allow that.',
    notFound: 'It is not there any more, or was never yours to see.',
    stale: 'Someone else saved while you were at work. Both are kept.',
    alreadyThere: 'It is there already.',
    expired: 'That link is too old to use.',
    tooMany: 'Too many tries. Wait a minute, then try again.',
    unavailable: 'The server is not ready yet. Try again in a moment.',
    broken: 'Something went wrong on the server. Nothing of yours was lost.',
    unreadable: 'The server answered something this page does not know. Reload the page.',
    screen: 'This screen stopped working',
    screenTells: 'What was saved is safe. Reload, and if it happens again go back to the list of sites.',
    reload: 'Reload',
  },

  notFound: {
    title: 'There is no such page',
    text: 'The address may be mistyped, or what it led to was removed.',
    home: 'Go to the sites',
  },

  when: {
    now: 'just now',
    minutes_one: '{{count}} minute ago',
    minutes_other: '{{count}} minutes ago',
    hours_one: '{{count}} hour ago',
    hours_other: '{{count}} hours ago',
    yesterday: 'yesterday',
  },

  cautions: {
    title: 'Before anyone works',
    codes:
      'Local codes and a licensed designer or engineer decide. This checks arithmetic, not structure: it does not say that a wall will stand.',
    accessZone:
      'Keep everyone but the masons out of the limited-access zone on the free side of a wall going up, and brace tall walls until they are tied in.',
    powerLines: 'Look up before raising steel: keep poles and braces well away from power lines.',
    silica: 'Cutting and grinding make silica dust. Wet it or draw it off, and wear a mask that fits.',
    lifting: 'Lift with your legs, and share heavy units and steel between two.',
    eyes: 'Wear eye protection to drill anchors, and to cut or grind.',
    bars: 'Cap every bar end that stands up.',
    wind: 'Nobody stands under a fresh wall in wind.',
  },
} as const;

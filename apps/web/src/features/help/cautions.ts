/** Said wherever air is let out or a shock comes off the bike. */
export const airOut = [
  'Support the bike before you let air out. Let it out slowly at the valve, then cycle the shock gently.',
  'A shock that stays down after letting the air out holds pressure inside: do not open it, take it to a workshop.',
  'Never unscrew a can under pressure and never touch the damper’s gas valve. Wear eye protection.',
] as const;

export const coilOff =
  'On a coil shock, back the collar right off before you lift the spring. A spring under load can injure.';

export const asPrinted =
  'The makers’ manuals and local rules come before anything here. Torque to the printed figure, never to a guess.';

export const askMechanic = 'If you are unsure, have a qualified mechanic do it.';

export const stopRiding = 'Stop riding if something knocks, leaks or comes loose.';

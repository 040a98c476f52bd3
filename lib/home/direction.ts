const words = ['north', 'north-east', 'east', 'south-east', 'south', 'south-west', 'west', 'north-west'] as const;

/** The nearest of eight directions, in words. Azimuth in degrees clockwise from true north. */
export function directionWord(azimuthDeg: number): (typeof words)[number] {
  const eighth = Math.round((((azimuthDeg % 360) + 360) % 360) / 45) % 8;
  return words[eighth] ?? 'north';
}

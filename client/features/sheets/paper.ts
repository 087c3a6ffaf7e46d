import type { CSSProperties } from 'react';

/** A sheet is paper in either theme: the light colours, also where the page around it is dark. */
export const PAPER = {
  '--paper': '#ffffff',
  '--sheet': '#ffffff',
  '--rule': '#d8d5cc',
  '--strong-rule': '#8a8a8a',
  '--pencil': '#1c1b19',
  '--graphite': '#55514a',
  '--ink': '#1d4f91',
  '--red': '#a31f18',
  '--ochre': '#6f4c00',
  color: '#1c1b19',
  colorScheme: 'light',
} as CSSProperties;

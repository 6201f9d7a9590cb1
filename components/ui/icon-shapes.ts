/** How one icon is drawn on a 24 by 24 grid: 2 px lines with mitred joins, and filled parts where lines would close up. */
export interface IconShape {
  /** Path data of the lines. */
  readonly lines?: string;
  /** Path data of filled parts, even-odd, so that an inner path is a hole. */
  readonly solid?: string;
}

const dot = (x: number, y: number, r: number): string =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0z`;

export const iconShapes = {
  room: { lines: 'M5 21V5L20 3.8V21M5 13h4M20 12h-4' },
  tops: { lines: 'M3 4h18v17h-5.5V10.5h-7V21H3zM3 4l5.5 6.5M21 4l-5.5 6.5' },
  slabs: { lines: 'M2 6.5h20v11H2zM2 10.2h12.4M2 13.9h9.6M14 13.9h8M17.3 6.5L9.6 17.5' },
  sheets: { lines: 'M5 3h14v18H5zM8 7.5h8M8 11.5h3M8 15.5h3M12.6 15l2.2 2.4 3-4.4' },
  share: { lines: 'M12 15.5V4M7.5 8L12 3.5 16.5 8M4 13v8h16v-8' },
  undo: { lines: 'M9 4L4 9l5 5M4.5 9H14a5.7 5.7 0 0 1 0 11.4h-2.5' },
  redo: { lines: 'M15 4l5 5-5 5M19.5 9H10a5.7 5.7 0 0 0 0 11.4h2.5' },
  plus: { lines: 'M12 4v16M4 12h16' },
  minus: { lines: 'M4 12h16' },
  more: { solid: `${dot(4.5, 12, 1.7)}${dot(12, 12, 1.7)}${dot(19.5, 12, 1.7)}` },
  back: { lines: 'M15.5 4L7.5 12l8 8' },
  next: { lines: 'M8.5 4l8 8-8 8' },
  down: { lines: 'M4.5 8.5l7.5 7.5 7.5-7.5' },
  up: { lines: 'M4.5 15.5L12 8l7.5 7.5' },
  close: { lines: 'M5 5l14 14M19 5L5 19' },
  check: { lines: 'M3.5 13l5.5 5.5L20.5 6' },
  warn: { solid: 'M12 1.8L.8 22h22.4zM11 9h2v6.2h-2zM11 17.2h2v2.3h-2z' },
  look: { lines: 'M12 4.2L3 20.8h18zM12 10.2v4.6M12 16.6v2' },
  note: { lines: `${dot(12, 12, 9)}M12 11v6M12 7v2` },
  retake: { lines: 'M18.7 16.5A8 8 0 1 1 18 7.4M20 3v6h-6' },
  sink: { lines: 'M3 6.5h18v13.5H3zM6.8 10.3h10.4v6H6.8zM12 3v7' },
  window: { lines: 'M4 3.5h16v14H4zM12 3.5v14M4 10.5h16M2 21h20' },
  range: { lines: `M4 3.5h16v17.5H4zM4 13.5h16${dot(8.6, 8.5, 1.9)}${dot(15.4, 8.5, 1.9)}` },
  corner: { lines: 'M4 3v17h17M4 12l8 8' },
  bow: { lines: 'M3 18.5C5 6.5 19 6.5 21 18.5M5.5 18.5h2.5M10.7 18.5h2.6M16 18.5h2.5' },
  lock: { lines: 'M4 21V4h17M10 9h3M16 9h3M9 10v3M9 16v3M12.5 13.5l7 7M19.5 13.5l-7 7' },
  camera: { lines: `M3 8h4.6l2-4h4.8l2 4H21v12H3z${dot(12, 13.6, 3.6)}` },
  saw: {
    lines: `${dot(12, 12, 7)}M12 5V2M12 22v-3M5 12H2M22 12h-3M7 7L5 5M17 7l2-2M7 17l-2 2M17 17l2 2`,
    solid: dot(12, 12, 2),
  },
  grain: { lines: 'M2 5.5h20M2 18.5h20M3.5 12h17M7.5 8.5L4 12l3.5 3.5M16.5 8.5L20 12l-3.5 3.5' },
  tape: { lines: 'M2 7.5h20v9.5H2zM6 7.5v4M10 7.5v3M14 7.5v4M18 7.5v3' },
  person: { lines: `${dot(12, 7.4, 4.2)}M3.8 21.5c0-9.6 16.4-9.6 16.4 0` },
  search: { lines: `${dot(10, 10, 6.5)}M14.8 14.8l6.7 6.7` },
  filter: { lines: 'M2.6 4h18.8l-6.9 8.4V20.5l-5-3v-5.1z' },
  cloudoff: { lines: 'M7 19h10.3a4.6 4.6 0 0 0 .8-9.1A6.4 6.4 0 0 0 6.2 9.4 4.9 4.9 0 0 0 7 19zM3.5 3.5l17.5 18' },
  print: { lines: 'M7 8V3h10v5M7 17H3V8h18v9h-4M7 13.5h10V21H7z' },
  link: { lines: 'M5.5 11.5l6-6a5 5 0 0 1 7 7l-6 6a5 5 0 0 1-7-7zM9.8 14.2l4.4-4.4' },
  rack: { lines: 'M3 3v18M21 3v18M3 9.6h18M3 17h18M7 9.6V6h6.5v3.6M7 17v-3.5h10.5V17' },
  stock: { lines: 'M2 4h20v16H2zM2 9.3h20M2 14.7h20' },
  jobs: { lines: 'M4 4h16v16H4zM4 9h16M9.5 9v11' },
  chat: { lines: 'M3 4h18v13H10l-4.6 4.2V17H3z' },
  turn: { lines: 'M2 13h3M8 13h3M13 13h3M19 13h3M5.5 8.5c1.5-5 10-6 13-1.2M18.8 2.8v5h-5M5 17v4h14v-4' },
  eye: { lines: `M1.8 12C8 3.3 16 3.3 22.2 12 16 20.7 8 20.7 1.8 12z${dot(12, 12, 3)}` },
  bksp: { lines: 'M8 5h14v14H8L1.8 12zM11.8 9l6 6M17.8 9l-6 6' },
  crew: {
    lines: `${dot(8.5, 8.2, 3.6)}M1.5 20.5c0-8.4 14-8.4 14 0${dot(17, 7.2, 2.8)}M17 13.2c3.6 0 5.6 2.6 5.6 6.4`,
  },
  fit: { lines: 'M3 8.5V3h5.5M15.5 3H21v5.5M21 15.5V21h-5.5M8.5 21H3v-5.5' },
  mail: { lines: 'M2.5 5h19v14h-19zM2.8 5.3l9.2 8.4 9.2-8.4' },
  lay: { lines: 'M12 3.2l9.4 5.3L12 13.8 2.6 8.5zM2.6 13.8l9.4 5.3 9.4-5.3' },
  download: { lines: 'M12 3v11.5M7.5 10.5L12 15l4.5-4.5M4 14v7h16v-7' },
  settings: { lines: `M2 7h6.2M13.8 7H22M2 17h9.2M16.8 17H22${dot(11, 7, 2.8)}${dot(14, 17, 2.8)}` },
  bin: { lines: 'M3 6h18M9 6V3h6v3M5.5 6l1 15h11l1-15M10 10.5v6M14 10.5v6' },
  pencil: { lines: 'M4 20l1.2-5L16.5 3.7l4 4L9 19zM13.5 6.7l4 4' },
  clock: { lines: `${dot(12, 12, 9)}M12 6.5V12l4 3` },
  calendar: { lines: 'M3 5h18v16H3zM3 10h18M8 2.5v5M16 2.5v5' },
  pin: { lines: 'M8 3h8M9.5 3v7L6 14.5h12L14.5 10V3M12 14.5V22' },
  help: { lines: `${dot(12, 12, 9)}M9 9.6a3 3 0 1 1 3.6 3c-.4.1-.6.5-.6 1.4M12 16v2` },
  leave: { lines: 'M13 3H4v18h9M9 12h12M17 7.5l4.5 4.5-4.5 4.5' },
  slide: { lines: 'M10 5v14M14 5v14M6 8l-4 4 4 4M18 8l4 4-4 4' },
} as const satisfies Readonly<Record<string, IconShape>>;

export type IconName = keyof typeof iconShapes;

import type { ReactNode } from 'react';

/** The drawings of the navigation. */
export type IconName =
  'desk' | 'decisions' | 'notices' | 'history' | 'readings' | 'forecasts' | 'rules' | 'admin' | 'person';

const DRAWINGS: Record<IconName, ReactNode> = {
  desk: <path d="M4 17h12M5 13c0-5 2-8 5-8s5 3 5 8M8 13l2-4 2 4" />,
  decisions: <path d="M4 10.5l4 4 8-9M4 18h12" />,
  notices: <path d="M5 3h7l3 3v11H5zM8 9h5M8 12.5h5" />,
  history: <path d="M3 17h14M3 13c3 0 3-7 6-7s3 5 5 5 2-2 3-2" />,
  readings: <path d="M10 3v14M6 17h8M6 6h4M6 9.5h4M6 13h4M13.5 6.5l3 3M16.5 6.5l-3 3" />,
  forecasts: (
    <path d="M6 15h8a3 3 0 0 0 .4-6A4.5 4.5 0 0 0 6 8.6 3.2 3.2 0 0 0 6 15M10 3v1.5M4.5 5l1 1M15.5 5l-1 1" />
  ),
  rules: <path d="M4 4h12v12H4zM7 8l1.5 1.5L11 7M7 13h6" />,
  admin: <path d="M3 6h9M16 6h1M3 14h2M9 14h8M14 4v4M7 12v4" />,
  person: <path d="M10 10a3 3 0 1 0 0-6 3 3 0 0 0 0 6M4 17c.6-3.4 3-5 6-5s5.4 1.6 6 5" />,
};

/** A small drawing beside a word, never instead of it. */
export function NavIcon({ name }: { name: IconName }) {
  return (
    <svg
      width="20"
      height="20"
      viewBox="0 0 20 20"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.7"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      {DRAWINGS[name]}
    </svg>
  );
}

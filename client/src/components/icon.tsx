import type { ReactElement } from 'react';

interface IconProps {
  /** A path of `@mdi/js`. */
  path: string;
  size?: number;
  /** Only where no words stand beside it. */
  label?: string;
}

export function Icon({ path, size = 20, label }: IconProps): ReactElement {
  const naming = label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true };
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 24 24"
      fill="currentColor"
      style={{ flex: 'none', display: 'block' }}
      {...naming}
    >
      <path d={path} />
    </svg>
  );
}

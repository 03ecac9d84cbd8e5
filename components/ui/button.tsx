import Link from 'next/link';
import type { ButtonHTMLAttributes, ComponentProps } from 'react';

type Variant = 'strong' | 'plain' | 'danger';

const SHAPE =
  'inline-flex min-h-11 items-center justify-center border px-4 py-2 text-base font-bold no-underline disabled:cursor-not-allowed disabled:opacity-50';

const FACE: Readonly<Record<Variant, string>> = {
  strong: 'border-spruce bg-spruce text-on-spruce hover:brightness-110',
  plain: 'border-line bg-panel text-ink hover:border-spruce',
  danger: 'border-beyond bg-panel text-beyond hover:bg-ground',
};

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly variant?: Variant;
}

export function Button({ variant = 'strong', type = 'button', className, ...rest }: ButtonProps) {
  return <button type={type} className={`${SHAPE} ${FACE[variant]} ${className ?? ''}`} {...rest} />;
}

interface ButtonLinkProps extends ComponentProps<typeof Link> {
  readonly variant?: Variant;
}

/** A link that looks like a button: it goes somewhere, it changes nothing. */
export function ButtonLink({ variant = 'strong', className, ...rest }: ButtonLinkProps) {
  return <Link className={`${SHAPE} ${FACE[variant]} ${className ?? ''}`} {...rest} />;
}

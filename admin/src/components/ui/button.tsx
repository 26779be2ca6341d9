import type { ComponentProps } from 'react';
import { Link, type LinkProps } from 'react-router-dom';

export type ButtonTone = 'action' | 'plain' | 'danger' | 'quiet';

const shape =
  'inline-flex items-center justify-center gap-2 rounded-sm border px-4 text-table font-medium transition-colors disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:opacity-60';
const tones: Readonly<Record<ButtonTone, string>> = {
  action: 'border-indigo bg-indigo text-on-indigo hover:bg-indigo-deep hover:border-indigo-deep',
  plain: 'border-rule bg-sheet text-ink hover:bg-well',
  danger: 'border-madder bg-sheet text-madder hover:bg-madder-tint',
  quiet: 'border-transparent bg-transparent text-indigo underline underline-offset-4 hover:bg-indigo-tint',
};
const heights = { dense: 'min-h-8', usual: 'min-h-10', table: 'min-h-12' } as const;

interface Look {
  readonly tone?: ButtonTone;
  /** `table` is for the measuring table: a gloved finger finds it. */
  readonly height?: keyof typeof heights;
}

const classes = ({ tone = 'plain', height = 'usual' }: Look, more = '') =>
  `${shape} ${tones[tone]} ${heights[height]} ${more}`;

export function Button({
  tone,
  height,
  className,
  type = 'button',
  ...rest
}: Look & ComponentProps<'button'>) {
  return <button {...rest} type={type} className={classes({ tone, height }, className)} />;
}

/** A link that is the page's next step, and therefore looks like a button. */
export function ButtonLink({ tone, height, className, ...rest }: Look & LinkProps & { className?: string }) {
  return <Link {...rest} className={classes({ tone, height }, className)} />;
}

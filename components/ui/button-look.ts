import { classNames } from './class-names';

/** fill: the one thing to do here. line: the others. plain: beside a line of text. chalk: takes away. */
export type ButtonLook = 'fill' | 'line' | 'plain' | 'chalk';
/** desk: dense office screens. thumb: phone screens, never under 56 px. */
export type ButtonSize = 'desk' | 'thumb';

const looks: Record<ButtonLook, string> = {
  fill: 'border-pine bg-pine text-on-fill hover:border-ink',
  line: 'border-pine bg-transparent text-pine hover:bg-tint',
  plain: 'border-transparent bg-transparent text-ink underline underline-offset-4 hover:bg-tint',
  chalk: 'border-chalk bg-transparent text-chalk hover:bg-tint',
};

const sizes: Record<ButtonSize, string> = {
  desk: 'min-h-9 px-3.5 py-1.5 text-body',
  thumb: 'min-h-thumb w-full px-4 py-3 text-lead',
};

export function buttonLook(look: ButtonLook, size: ButtonSize, className?: string): string {
  return classNames(
    'inline-flex items-center justify-center gap-2 rounded border text-center font-bold',
    'disabled:cursor-not-allowed disabled:border-rule disabled:bg-tint disabled:text-graphite',
    looks[look],
    sizes[size],
    className,
  );
}

import { showToast } from '@/components/ui/toast-store';
import { problemOf } from './ask-server';

/** Says what went wrong where no form stands to say it. */
export function sayProblem(caught: unknown): void {
  const { title, detail } = problemOf(caught);
  showToast({ text: [title, detail].filter(Boolean).join('. '), isProblem: true });
}

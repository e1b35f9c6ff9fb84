'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { controlLook } from '@/components/ui/field-frame';
import type { TableView } from '@/components/ui/remembered-view';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import type { SavedView } from '@/lib/contracts/saved-views';
import { apiPaths } from '@/lib/paths';

type SavedViewsProps = {
  table: string;
  view: TableView;
  changeView: (change: Partial<TableView>) => void;
};

/** Views of this table under names of one's own: picked, kept, forgotten. */
export function SavedViews({ table, view, changeView }: SavedViewsProps) {
  const [isNaming, setIsNaming] = useState(false);
  const client = useQueryClient();
  const queryKey = ['saved-views', table];
  const { data: kept = [] } = useQuery({
    queryKey,
    queryFn: ({ signal }) => askServer<SavedView[]>(apiPaths.viewsOf(table), { signal }),
  });
  const settled = () => client.invalidateQueries({ queryKey });
  const onError = (caught: unknown) =>
    showToast({ text: problemOf(caught).title, isProblem: true });
  const keep = useMutation({
    mutationFn: (name: string) =>
      askServer(apiPaths.views(), { method: 'POST', body: { table, name, view } }),
    onSuccess: () => {
      setIsNaming(false);
      return settled();
    },
    onError,
  });
  const forget = useMutation({
    mutationFn: (viewId: string) => askServer(apiPaths.view(viewId), { method: 'DELETE' }),
    onSuccess: settled,
    onError,
  });
  const shown = kept.find((one) => JSON.stringify(one.view) === JSON.stringify(view));

  return (
    <>
      {kept.length > 0 ? (
        <select
          aria-label="Your views"
          value={shown?.id ?? ''}
          onChange={(event) => {
            const picked = kept.find(({ id }) => id === event.target.value);
            if (picked) changeView(picked.view);
          }}
          className={`${controlLook} max-w-44`}
        >
          <option value="" disabled>
            Your views
          </option>
          {kept.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </select>
      ) : null}
      {shown ? (
        <Button look="line" onClick={() => forget.mutate(shown.id)}>
          Forget this view
        </Button>
      ) : (
        <Button look="line" onClick={() => setIsNaming(true)}>
          Keep this view
        </Button>
      )}
      <Dialog isOpen={isNaming} onClose={() => setIsNaming(false)} title="Keep this view">
        <form
          className="flex flex-col gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            keep.mutate(String(new FormData(event.currentTarget).get('name') ?? ''));
          }}
        >
          <TextField
            label="Its name"
            name="name"
            required
            maxLength={40}
            hint="What is typed, chosen and sorted now comes back under this name, on every device."
          />
          <div>
            <Button type="submit" busyText={keep.isPending ? 'Keeping…' : undefined}>
              Keep it
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}

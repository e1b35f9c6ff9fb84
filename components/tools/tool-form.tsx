'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer, RequestProblem } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { showToast } from '@/components/ui/toast-store';
import { apiPaths } from '@/lib/paths';
import { readToolFields, type ToolSpec } from '@/lib/rules/tool-spec';
import type { LengthUnit } from '@/lib/units/brands';
import { ToolFields } from './tool-fields';

type ToolFormProps = {
  /** Null for a tool that is yet to be added. */
  toolId: string | null;
  name: string;
  spec: ToolSpec;
  unit: LengthUnit;
};

/** One tool: changed where it stands, or added. */
export function ToolForm({ toolId, name, spec, unit }: ToolFormProps) {
  const router = useRouter();
  const form = useFormRequest(
    async (fields) => {
      const read = readToolFields(fields, spec, unit);
      if (!read.spec) throw notRead(read.errors);
      const body = { name: fields.name ?? '', spec: read.spec };
      await (toolId
        ? askServer(apiPaths.tool(toolId), { method: 'PATCH', body })
        : askServer(apiPaths.tools(), { body }));
    },
    () => {
      form.rest();
      showToast({ text: toolId ? 'Saved. Fits are as sure as it says from now on.' : 'Added' });
      router.refresh();
    },
  );
  return (
    <form onSubmit={form.submit} className="flex max-w-2xl flex-col gap-3 py-3">
      <ToolFields name={name} spec={spec} unit={unit} errorOf={form.errorOf} />
      <FormError problem={form.problem} shownFields={Object.keys(form.problem?.errors ?? {})} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Saving…' : undefined}>
          {toolId ? 'Save this tool' : 'Add the tool'}
        </Button>
      </div>
    </form>
  );
}

function notRead(errors: Record<string, string>): RequestProblem {
  return new RequestProblem({
    type: 'urn:setwell:problem:not-understood',
    title: 'Some figures could not be read.',
    status: 422,
    detail: 'Nothing was changed.',
    errors,
  });
}

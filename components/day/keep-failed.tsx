import { useCrew } from './crew-language';

/** What was tapped is not safe: said where it was tapped. */
export function KeepFailed({ isFailed }: { isFailed: boolean }) {
  const { words } = useCrew();
  if (!isFailed) return null;
  return (
    <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
      {words.keepFailed}
    </p>
  );
}

type Props = { address: string; revision?: number; date?: string };

/** On paper only: which revision of which address this was, and of when. */
export function PrintLine({ address, revision, date }: Props) {
  return (
    <p className="print-only mt-6 border-t border-rule pt-2 text-sm">
      {['Fumelore', address, revision !== undefined && `revision ${revision}`, date].filter(Boolean).join(' · ')}
    </p>
  );
}

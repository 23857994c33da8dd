import { TextLink } from '@/components/ui/TextLink'

/** The packet as the browser shows PDFs; phones open it on its own, where it can be held in two fingers. */
export function PacketFrame({ url, label }: { url: string; label: string }) {
  return (
    <div className="mt-6">
      <div className="paper-frame max-sm:hidden">
        <iframe
          src={`${url}#view=FitH&navpanes=0`}
          title={label}
          className="block h-[70rem] max-h-[130vh] w-full rounded border border-rule bg-surface"
        />
      </div>
      <p className="mt-2 text-table text-muted">
        <TextLink href={url} plain>
          Open the packet as a PDF
        </TextLink>{' '}
        if it does not show here.
      </p>
    </div>
  )
}

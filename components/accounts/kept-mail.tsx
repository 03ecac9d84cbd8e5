import { Panel } from '@/components/ui/panel';

interface KeptMailProps {
  readonly mail: { readonly to: string; readonly subject: string; readonly text: string; readonly receivedAt: Date };
}

export function KeptMail({ mail }: KeptMailProps) {
  return (
    <Panel title={mail.subject}>
      <p className="text-muted mb-3 text-sm">
        To {mail.to}, {mail.receivedAt.toISOString().slice(0, 19).replace('T', ' ')} UTC
      </p>
      <p className="break-words whitespace-pre-wrap">
        {mail.text.split(/(https?:\/\/\S+)/).map((part, index) =>
          index % 2 === 1 ? (
            <a key={index} href={part} className="underline">
              {part}
            </a>
          ) : (
            part
          ),
        )}
      </p>
    </Panel>
  );
}

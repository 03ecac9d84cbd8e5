import { Button } from '@/components/ui/button';
import { Cell, DataTable, HeadCell } from '@/components/ui/data-table';

interface TokenListProps {
  readonly tokens: readonly {
    readonly id: string;
    readonly name: string;
    readonly createdAt: Date;
    readonly lastUsedAt: Date | null;
    readonly revokedAt: Date | null;
  }[];
  readonly revoke: (form: FormData) => Promise<void>;
}

export function TokenList({ tokens, revoke }: TokenListProps) {
  if (tokens.length === 0) return <p className="text-muted">You have no tokens. A program of yours needs one.</p>;
  return (
    <DataTable caption="Personal tokens">
      <thead>
        <tr>
          <HeadCell>Name</HeadCell>
          <HeadCell>Made</HeadCell>
          <HeadCell>Last used</HeadCell>
          <HeadCell>
            <span className="sr-only">Revoke</span>
          </HeadCell>
        </tr>
      </thead>
      <tbody>
        {tokens.map((token) => (
          <tr key={token.id}>
            <Cell>{token.name}</Cell>
            <Cell>{utc(token.createdAt)}</Cell>
            <Cell>{token.lastUsedAt ? utc(token.lastUsedAt) : 'never'}</Cell>
            <Cell>
              {token.revokedAt ? (
                `revoked ${utc(token.revokedAt)}`
              ) : (
                <form action={revoke}>
                  <input type="hidden" name="tokenId" value={token.id} />
                  <Button type="submit" variant="danger" aria-label={`Revoke “${token.name}”`}>
                    Revoke
                  </Button>
                </form>
              )}
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}

function utc(instant: Date): string {
  return `${instant.toISOString().slice(0, 16).replace('T', ' ')} UTC`;
}

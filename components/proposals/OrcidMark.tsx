import { TextLink } from '@/components/ui/TextLink'

/** An ORCID iD as a link, and whether its owner has proved it. */
export function OrcidMark({ orcid, isVerified }: { orcid: string; isVerified: boolean }) {
  return (
    <>
      <TextLink href={`https://orcid.org/${orcid}`} plain>
        orcid.org/{orcid}
      </TextLink>{' '}
      <span className="text-muted">({isVerified ? 'verified' : 'not verified'})</span>
    </>
  )
}

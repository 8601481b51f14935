import { usePublicUrl } from './site.ts';

export interface HeadProps {
  title: string;
  description?: string;
  /** Path of the page's one address, for the canonical link; left out on pages that are nobody's to find. */
  path?: string;
  feeds?: { title: string; rss: string; json: string };
}

/** What a page says of itself to browsers, feed readers and crawlers. React lifts it into the document's head. */
export function Head({ title, description, path, feeds }: HeadProps) {
  const publicUrl = usePublicUrl();
  return (
    <>
      <title>{title === 'Tallywright' ? title : `${title} · Tallywright`}</title>
      {description && <meta name="description" content={description} />}
      {path !== undefined ? <link rel="canonical" href={`${publicUrl}${path}`} /> : <meta name="robots" content="noindex" />}
      {feeds && <link rel="alternate" type="application/rss+xml" title={feeds.title} href={feeds.rss} />}
      {feeds && <link rel="alternate" type="application/feed+json" title={feeds.title} href={feeds.json} />}
    </>
  );
}

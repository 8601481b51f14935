import RSS from 'rss';
import type { Feed } from './feed.service.ts';

const generator = '<generator>Tallywright</generator>';
// the package dates a feed by the clock, which would make every answer a new version of it
const buildDate = new RegExp(`${generator}<lastBuildDate>[^<]*</lastBuildDate>`);

/** Plain text as the HTML a feed reader takes an RSS description for. */
function asHtml(text: string): string {
  return text.replace(/[&<>"]/g, (letter) => `&#${letter.charCodeAt(0)};`);
}

/** RSS 2.0 with full content (content:encoded), a self link (atom:link) and permanent guids. */
export function rssOf(feed: Feed, publicUrl: string): string {
  const rss = new RSS({
    title: feed.title, description: asHtml(feed.description), site_url: feed.homeUrl, feed_url: `${publicUrl}${feed.path}.xml`, generator: 'Tallywright', language: 'en',
    ...(feed.modified ? { pubDate: feed.modified } : {}),
    custom_namespaces: { content: 'http://purl.org/rss/1.0/modules/content/', dc: 'http://purl.org/dc/elements/1.1/' },
  });
  for (const item of feed.items) {
    rss.item({
      title: item.title, description: asHtml(item.lead || item.title), url: item.url, guid: item.guid, date: item.published, author: item.author, categories: [...item.tags],
      custom_elements: [{ 'content:encoded': { _cdata: item.html } }],
    });
  }
  return rss.xml().replace(buildDate, () => `${generator}<lastBuildDate>${(feed.modified ?? new Date(0)).toUTCString()}</lastBuildDate>`);
}

/** JSON Feed 1.1. */
export function jsonFeedOf(feed: Feed, publicUrl: string): string {
  return JSON.stringify({
    version: 'https://jsonfeed.org/version/1.1', title: feed.title, home_page_url: feed.homeUrl, feed_url: `${publicUrl}${feed.path}.json`, description: feed.description, language: 'en',
    items: feed.items.map((item) => ({
      id: item.guid, url: item.url, title: item.title, ...(item.lead ? { summary: item.lead } : {}), content_html: item.html,
      date_published: item.published.toISOString(), date_modified: item.modified.toISOString(), authors: [{ name: item.author }],
      ...(item.picture ? { image: item.picture } : {}), ...(item.tags.length > 0 ? { tags: item.tags } : {}),
    })),
  });
}

import { describe, expect, it } from 'vitest';
import { letterHtml, letterText } from '../../src/server/mail';

const letter = {
  to: 'odile@example.com',
  subject: 'Confirm <now>',
  paragraphs: ['Hello <b>Odile</b> & "co",', 'Follow the link.'],
  link: { word: 'Confirm', url: 'http://ellwise.test/confirm?token=a&b' },
};

describe('letterText', () => {
  it('sets the link on a line of its own, where every mail program finds it', () => {
    expect(letterText(letter)).toBe(
      'Hello <b>Odile</b> & "co",\n\nFollow the link.\n\nConfirm:\nhttp://ellwise.test/confirm?token=a&b\n\nEllwise\n',
    );
  });
});

describe('letterHtml', () => {
  it('escapes what a person wrote, so that a name cannot become markup', () => {
    const html = letterHtml(letter);
    expect(html).toContain('<p>Hello &lt;b&gt;Odile&lt;/b&gt; &amp; &quot;co&quot;,</p>');
    expect(html).toContain('<title>Confirm &lt;now&gt;</title>');
    expect(html).toContain('<a href="http://ellwise.test/confirm?token=a&amp;b">Confirm</a>');
  });
});

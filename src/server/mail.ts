import { createTransport, type Transporter } from 'nodemailer';

/** What a letter says: paragraphs, and perhaps one link to follow. */
export interface Letter {
  to: string;
  subject: string;
  paragraphs: readonly string[];
  link?: { word: string; url: string };
}

const TIMEOUT_MS = 10_000;

let transport: Transporter | undefined;

function mailTransport(): Transporter {
  if (!process.env.SMTP_URL) throw new Error('SMTP_URL is not set');
  transport ??= createTransport(
    {
      url: process.env.SMTP_URL,
      connectionTimeout: TIMEOUT_MS,
      greetingTimeout: TIMEOUT_MS,
      socketTimeout: TIMEOUT_MS,
    },
    { from: process.env.MAIL_FROM ?? 'Ellwise <no-reply@ellwise.example>' },
  );
  return transport;
}

/** Sends a letter; false, and a line in the log, when it could not. The caller says so and goes on. */
export async function sendLetter(letter: Letter): Promise<boolean> {
  try {
    await mailTransport().sendMail({
      to: { name: '', address: letter.to },
      subject: letter.subject,
      text: letterText(letter),
      html: letterHtml(letter),
    });
    return true;
  } catch (error) {
    console.error('mail was not sent:', error instanceof Error ? error.message : error);
    return false;
  }
}

export function letterText({ paragraphs, link }: Letter): string {
  const parts = link ? [...paragraphs, `${link.word}:\n${link.url}`] : paragraphs;
  return `${parts.join('\n\n')}\n\nEllwise\n`;
}

export function letterHtml({ paragraphs, link, subject }: Letter): string {
  const body = paragraphs.map((text) => `<p>${escapeHtml(text)}</p>`);
  if (link) {
    const url = escapeHtml(link.url);
    body.push(`<p><a href="${url}">${escapeHtml(link.word)}</a></p>`, `<p>${url}</p>`);
  }
  return (
    `<!doctype html><html lang="en"><head><meta charset="utf-8">` +
    `<title>${escapeHtml(subject)}</title></head><body>${body.join('')}<p>Ellwise</p></body></html>`
  );
}

const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character] ?? character);
}

import { createTransport } from 'nodemailer';

export interface Mail {
  to: string;
  subject: string;
  text: string;
  attachments?: { filename: string; contentType: string; content: Buffer }[];
}

export interface Mailer {
  /** Hands a letter to the mail server. @throws if it was not taken; the caller tries again. */
  send: (mail: Mail) => Promise<void>;
}

type Options = { from: string } & ({ url: string } | { host: string; port: number });

const signature = `

Tubeplate
Tubeplate issues no certificate of safety. Before a boiler is steamed, the inspector of your club or insurer must test it under your local code.`;

/** Letters by SMTP. A plain host and port is the stand-in on loopback; a URL carries the credentials of a real server. */
export function createMailer(options: Options): Mailer {
  const transport =
    'url' in options
      ? createTransport(options.url)
      : createTransport({ host: options.host, port: options.port, secure: false, ignoreTLS: true });
  return {
    send: async ({ text, ...mail }) => {
      await transport.sendMail({ ...mail, from: options.from, text: text + signature });
    },
  };
}

import type { Ctx } from '../ctx.ts';
import type { Job } from './jobs.ts';

/** Does a promised job. Every one may run twice: each looks first whether it still needs doing. */
export async function handleJob(ctx: Ctx, job: Job): Promise<void> {
  switch (job.kind) {
    case 'send-letter': {
      const { attachments = [], ...letter } = job.data;
      await ctx.mail.send({
        ...letter,
        attachments: attachments.map(({ base64, ...rest }) => ({
          ...rest,
          content: Buffer.from(base64, 'base64'),
        })),
      });
      return;
    }
  }
}

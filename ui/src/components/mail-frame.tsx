import { useState, type SyntheticEvent } from 'react';
import styles from './mail-frame.module.css';

const LEAST_HEIGHT = 320;

/** A mail as its reader sees it, shut in a frame that runs no script; as high as the mail, so that nothing scrolls twice. */
export function MailFrame({ title, html }: { title: string; html: string }) {
  const [height, setHeight] = useState(LEAST_HEIGHT);
  const handleLoad = (event: SyntheticEvent<HTMLIFrameElement>) => {
    const mail = event.currentTarget.contentDocument?.documentElement;
    if (mail) setHeight(Math.max(mail.scrollHeight, LEAST_HEIGHT));
  };
  return (
    <iframe
      className={styles.frame}
      title={title}
      srcDoc={html}
      // Same origin only to measure the mail's height: without allow-scripts nothing in it can run.
      sandbox="allow-same-origin"
      style={{ height }}
      onLoad={handleLoad}
    />
  );
}

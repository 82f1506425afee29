import { chownSync, existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { installDebian } from './debian.mjs';
import { root, startChild, stopChild } from './node.mjs';
import { clusterFolder } from './postgres.mjs';

const program = '/usr/sbin/nginx';
/** Debian's account that owns nothing. */
const nobody = 65534;

/** Installs nginx from Debian's packages where there is none. */
export function requireNginx() {
  if (!existsSync(program)) installDebian(['nginx'], 'nginx');
}

/**
 * Starts nginx on `port` of loopback, unprivileged and with a configuration of our own, in front of
 * several instances. Neither is ever given up: an instance that is away refuses at once. A request whose instance is going away is given to another; that may be done
 * with every request of ours, since a repeated one is known by its key.
 */
export async function startProxy({ port, instances }) {
  const folder = clusterFolder(path.join(root, '.hornbeam-test', `nginx-${process.pid}`));
  mkdirSync(folder, { recursive: true });
  const file = path.join(folder, 'nginx.conf');
  writeFileSync(file, configuration({ folder, port, instances }));
  const isRoot = process.getuid?.() === 0;
  if (isRoot) chownSync(folder, nobody, nobody);
  const args = ['-c', file, '-e', path.join(folder, 'error.log')];
  const proxy = isRoot
    ? startChild('setpriv', [
        `--reuid=${nobody}`,
        `--regid=${nobody}`,
        '--clear-groups',
        '--',
        program,
        ...args,
      ])
    : startChild(program, args);
  return {
    address: `http://127.0.0.1:${port}`,
    stop: async () => {
      await stopChild(proxy);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

function configuration({ folder, port, instances }) {
  const temporary = ['client_body', 'proxy', 'fastcgi', 'uwsgi', 'scgi'];
  return `daemon off;
worker_processes 1;
pid ${folder}/nginx.pid;
error_log ${folder}/error.log;
events { worker_connections 512; }
http {
  access_log off;
  ${temporary.map((kind) => `${kind}_temp_path ${folder}/${kind};`).join('\n  ')}
  upstream hornbeam {
    ${instances.map((address) => `server ${new URL(address).host} max_fails=0;`).join('\n    ')}
  }
  server {
    listen 127.0.0.1:${port};
    location / {
      proxy_pass http://hornbeam;
      proxy_http_version 1.1;
      proxy_set_header Connection "";
      proxy_set_header Host $http_host;
      proxy_set_header X-Forwarded-For $remote_addr;
      proxy_connect_timeout 1s;
      proxy_next_upstream error timeout http_502 http_503 non_idempotent;
      proxy_next_upstream_tries 2;
    }
  }
}
`;
}

import { spawnSync } from 'node:child_process';
import { appendFileSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { Remedy, say } from './say.mjs';

const clusterConf = '/etc/postgresql-common/createcluster.conf';

/** Installs Debian packages as root or through sudo; otherwise names the one command to run. */
export function installDebian(packages, purpose) {
  const command = `apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  const prefix = asRoot();
  if (!prefix || !existsSync('/usr/bin/apt-get')) {
    throw new Remedy(
      `${purpose} is missing, and this account may not install it.`,
      `Run this once as root, then start again:  ${installCommand(packages, command)}`,
    );
  }
  say(`Installing ${packages.join(', ')} from Debian's packages …`);
  apt(prefix, ['update', '-qq']);
  if (packages.includes('postgresql')) withholdMainCluster(prefix);
  withoutStarting(prefix, () => {
    apt(prefix, ['install', '-y', '-qq', '--no-install-recommends', ...packages]);
  });
}

function installCommand(packages, command) {
  if (!packages.includes('postgresql')) return command;
  return (
    `apt-get install -y postgresql-common && mkdir -p /etc/postgresql-common/createcluster.d && ` +
    `echo "create_main_cluster = false" > /etc/postgresql-common/createcluster.d/hornbeam.conf && ${command}`
  );
}

/** How to become root: directly, through a sudo that asks nothing, or not at all. */
function asRoot() {
  if (process.getuid?.() === 0) return [];
  const sudo = spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' });
  return sudo.status === 0 ? ['sudo', '-n'] : null;
}

/**
 * Debian starts a server's service when its package is installed, unless this policy says no: what
 * we need is the program alone.
 */
function withoutStarting(prefix, install) {
  const policy = '/usr/sbin/policy-rc.d';
  if (existsSync(policy)) return install();
  const asOwner = (script) => {
    const [command, ...args] = [...prefix, 'sh', '-c', script];
    spawnSync(command, args, { stdio: 'ignore' });
  };
  asOwner(`printf '#!/bin/sh\\nexit 101\\n' > ${policy} && chmod 755 ${policy}`);
  try {
    return install();
  } finally {
    asOwner(`rm -f ${policy}`);
  }
}

function apt(prefix, args) {
  const [command, ...rest] = [...prefix, 'apt-get', ...args];
  const done = spawnSync(command, rest, {
    encoding: 'utf8',
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  if (done.status === 0) return;
  throw new Remedy(
    `apt-get ${args.join(' ')} did not succeed.\n${done.stderr ?? done.error?.message}`,
    'See the lines above for the reason; a machine without network needs the packages beforehand.',
  );
}

/** Debian's package would otherwise make and start a cluster of its own on port 5432. */
function withholdMainCluster(prefix) {
  apt(prefix, ['install', '-y', '-qq', '--no-install-recommends', 'postgresql-common']);
  const line = 'create_main_cluster = false';
  const includes =
    existsSync(clusterConf) && /^include_dir/m.test(readFileSync(clusterConf, 'utf8'));
  const file = includes ? '/etc/postgresql-common/createcluster.d/hornbeam.conf' : clusterConf;
  if (prefix.length === 0) {
    mkdirSync('/etc/postgresql-common/createcluster.d', { recursive: true });
    if (includes) writeFileSync(file, `${line}\n`);
    else appendFileSync(file, `\n${line}\n`);
    return;
  }
  const script = `mkdir -p /etc/postgresql-common/createcluster.d && echo '${line}' >> ${file}`;
  spawnSync(prefix[0], [...prefix.slice(1), 'sh', '-c', script], { stdio: 'ignore' });
}

/** The words that lie in the folder itself, for whoever puts it on a server. */
import { hashedFolder } from './headers';

export const readme = (address: string, version: string): string => `Flaskpace ${version}, for ${address}

Put everything in this folder at ${address}, on a web server that speaks HTTPS.
Then load manifest.xml in Excel, or give it to your administrator.

A new version: copy it over the old one and leave the old files in ${hashedFolder}/ where they are
for a while; pages that are still open ask for them. Then load the new manifest.xml.

_headers says what the server should send along with each file: what the pages may load and who may
show them, and how long a file may be kept. Some hosts read the file by themselves, at the root of
the site; on another server, set the same there. functions.json needs Access-Control-Allow-Origin for
Excel on the web. The file is not needed by Excel on Windows and Mac.

SHA256SUMS: "sha256sum -c SHA256SUMS" tells whether all files arrived as they were made.
help/index.html: the functions, for people to read.
`;

export const helpText = `leeside: send sweep files from the bench, and see how they are read

  leeside login --url URL            keep the address and an API token (asked for, or in LEESIDE_TOKEN)
  leeside sessions                   the latest sessions with their ids
  leeside send FOLDER --session ID   send every file of a folder once and wait until each is read
        --role ROLE                  reference, enclosed, noise, leakage or ambient, for all of them;
                                     without it the words in each file's name are taken as a guess
        --sample CODE                the sample that the enclosed sweeps belong to
        --condition TEXT             such as "folded twice"
        --watch                      go on: send what appears in the folder until Ctrl-C, which finishes
                                     what is under way; Ctrl-C again ends at once
  leeside read FILE                  how a file would be read, without any server
  leeside curve ID --csv             the exact numbers of a curve
  --json                             machine-readable output, with every command
  --help                             this text

The token: sign in with the browser, "Tokens", make one. LEESIDE_URL and LEESIDE_TOKEN in the environment
go before what login kept.

Exit code: 0 done · 1 failed, or a file was not sent · 2 a file needs an answer · 3 a file was refused
           64 wrong use · 130 interrupted
`;

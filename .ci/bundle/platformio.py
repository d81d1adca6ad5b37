# For PlatformIO, which runs it by library.json: gives the program the library that fits the board's part and float ABI. The
# compiler itself is asked, with the board's flags.
import os
import shlex
import subprocess

Import("env")  # noqa: F821, PlatformIO's

root = os.path.realpath(".")
command = shlex.split(env.subst("$CC $CFLAGS $CCFLAGS"))  # noqa: F821
asked = subprocess.run(
    command + ["-x", "c", "-E", "-P", "-DFIELDSTOP_NAME_PART", os.path.join(root, "include", "fieldstop_part.h")],
    env=env["ENV"],  # noqa: F821
    stdout=subprocess.PIPE,
    stderr=subprocess.PIPE,
    universal_newlines=True,
)
if asked.returncode != 0:
    said = [line.split('"')[1] for line in asked.stderr.splitlines() if line.count('"') > 1 and "#error" in line]
    raise SystemExit(said[0] if said else asked.stderr + "fieldstop: the compiler does not tell the part")
part = asked.stdout.strip()
print("fieldstop: the library for " + part)
env.Append(LIBPATH=[os.path.join(root, "lib", part)], LIBS=["fieldstop"])  # noqa: F821

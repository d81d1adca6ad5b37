//! What several test programs share.

use std::io::Write;

/// Tells that a check is left out for want of a tool, past the test harness, which keeps back what is printed.
pub fn skipped(what: &str) {
    let line = format!("skipped: {what}\n");
    std::io::stderr().write_all(line.as_bytes()).unwrap();
}

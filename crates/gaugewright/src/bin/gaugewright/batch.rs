//! Many requests in one run: lines of JSON in, one line of JSON out for each, in order.

use std::fs::File;
use std::io::{self, BufRead, BufReader, BufWriter, ErrorKind, Read, Write};
use std::path::Path;

use gaugewright::Failure;
use gaugewright::report::{brief, to_json_line};
use gaugewright::request::Request;
use rayon::prelude::*;
use roots::Numbering;
use serde_json::json;

use crate::exit_status::ExitStatus;

/// Lines answered together on all cores before they are printed, at most.
const LINES_AT_ONCE: usize = 512;

/// Bytes read at a time: a file fills it, a pipe or terminal gives what it has.
const BYTES_AT_ONCE: usize = 1 << 20;

/// The lines of requests.
type Lines = BufReader<Box<dyn Read>>;

/// The longest line that is read; a model is far shorter.
const LONGEST_LINE: usize = 4 << 20;

pub(crate) fn run(file: &Path, numbering: Numbering) -> Result<ExitStatus, Failure> {
    let mut lines = open(file)?;
    let mut out = BufWriter::new(io::stdout().lock());
    loop {
        let chunk = read_lines(&mut lines, file)?;
        if chunk.is_empty() {
            break;
        }
        let answers: Vec<String> = chunk
            .par_iter()
            .map(|line| answer(line, numbering))
            .collect();
        for answer in answers {
            if !still_read(writeln!(out, "{answer}"))? {
                return Ok(ExitStatus::Done);
            }
        }
        // What is answered is printed before more is read, so that a pipe can talk back and forth.
        if !still_read(out.flush())? {
            return Ok(ExitStatus::Done);
        }
    }
    Ok(ExitStatus::Done)
}

/// False where the reader of our output has had enough, such as `head`.
fn still_read(written: io::Result<()>) -> Result<bool, Failure> {
    match written {
        Ok(()) => Ok(true),
        Err(error) if error.kind() == ErrorKind::BrokenPipe => Ok(false),
        Err(error) => Err(Failure::Output(error)),
    }
}

fn open(file: &Path) -> Result<Lines, Failure> {
    let buffered = |input: Box<dyn Read>| BufReader::with_capacity(BYTES_AT_ONCE, input);
    if file == Path::new("-") {
        return Ok(buffered(Box::new(io::stdin().lock())));
    }
    let opened = File::open(file).and_then(|opened| match opened.metadata()?.is_dir() {
        true => Err(io::Error::from(ErrorKind::IsADirectory)),
        false => Ok(opened),
    });
    match opened {
        Ok(opened) => Ok(buffered(Box::new(opened))),
        Err(error) => Err(Failure::unreadable(file, error)),
    }
}

/// A line as read: text, or why it is none.
type Line = Result<String, String>;

/// The next lines, as many as are at hand but at least one; empty ones are left out. It never
/// waits for a second line: whoever writes one and waits for its answer gets it.
fn read_lines(lines: &mut Lines, file: &Path) -> Result<Vec<Line>, Failure> {
    let mut chunk = Vec::new();
    while chunk.is_empty() || (chunk.len() < LINES_AT_ONCE && lines.buffer().contains(&b'\n')) {
        match read_line(lines).map_err(|error| Failure::unreadable(file, error))? {
            None => break,
            Some(Ok(line)) if line.trim().is_empty() => {}
            Some(line) => chunk.push(line),
        }
    }
    Ok(chunk)
}

fn read_line(lines: &mut Lines) -> io::Result<Option<Line>> {
    let mut bytes = Vec::new();
    let mut too_long = false;
    loop {
        let at_hand = lines.fill_buf()?;
        if at_hand.is_empty() {
            if bytes.is_empty() && !too_long {
                return Ok(None);
            }
            break;
        }
        let end = at_hand.iter().position(|&byte| byte == b'\n');
        let taken = end.unwrap_or(at_hand.len());
        too_long |= bytes.len() + taken > LONGEST_LINE;
        if !too_long {
            bytes.extend_from_slice(&at_hand[..taken]);
        }
        lines.consume(taken + usize::from(end.is_some()));
        if end.is_some() {
            break;
        }
    }
    Ok(Some(if too_long {
        let most = LONGEST_LINE >> 20;
        Err(format!(
            "the line is longer than {most} MiB; write one request on each line"
        ))
    } else {
        String::from_utf8(bytes)
            .map_err(|_| "the line is not UTF-8 text; write JSON in UTF-8".to_owned())
    }))
}

fn answer(line: &Line, numbering: Numbering) -> String {
    let answered = match line {
        Ok(line) => Request::from_json_line(line)
            .and_then(|request| request.answer(numbering))
            .map_err(|failure| failure.to_string()),
        Err(why) => Err(why.clone()),
    };
    match answered {
        Ok(answer) => answer.json(),
        Err(why) => {
            let error = json!({ "error": brief(&why) });
            to_json_line(&error).expect("words have a JSON form")
        }
    }
}

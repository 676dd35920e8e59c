package nappe.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import nappe.input.Fault;
import nappe.input.InputRefused;
import nappe.input.NotWritten;
import nappe.method.MethodException;
import nappe.source.TextException;
import nappe.source.TextFault;
import nappe.station.DesignFault;
import picocli.CommandLine;

/** Turns what a command throws into messages and an exit status; never a stack trace on the screen. */
final class Failures implements CommandLine.IExecutionExceptionHandler {
    /** So the faults of a damaged file start, whatever is wrong inside. */
    private static final String DAMAGED = "the file is damaged";

    @Override
    public int handleExecutionException(Exception failure, CommandLine line, CommandLine.ParseResult parsed) {
        PrintWriter err = line.getErr();
        if (failure instanceof InputRefused refused) {
            return refused(err, refused.faults());
        }
        if (failure instanceof TextException text) {
            return inTexts(err, text.faults());
        }
        if (failure instanceof MethodException method) {
            return inTexts(err, method.faults());
        }
        if (failure instanceof Refusal refusal) {
            err.println(refusal.getMessage());
            return refusal.status();
        }
        if (failure instanceof java.io.IOException) {
            err.println("nappe: " + inWords((java.io.IOException) failure) + " (fault: file)");
            return ExitStatus.INTERNAL_FAULT;
        }
        return internal(err, failure);
    }

    private static int refused(PrintWriter err, List<Fault> faults) {
        faults.forEach(fault -> err.println(fault));
        if (faults.stream().anyMatch(fault -> fault.message().startsWith(DAMAGED))) {
            err.println(
                    "A damaged file: open it in a spreadsheet program, look it through and save it under a new name, or get"
                            + " it again from where it came from.");
        }
        err.println(
                faults.size() == 1
                        ? "1 fault; no package was written."
                        : faults.size() + " faults; no package was written.");
        return ExitStatus.INPUT_REFUSED;
    }

    private static int inTexts(PrintWriter err, List<TextFault> faults) {
        faults.forEach(fault -> err.println(fault));
        err.println(
                faults.size() == 1 ? "1 fault; nothing was written." : faults.size() + " faults; nothing was written.");
        return ExitStatus.INPUT_REFUSED;
    }

    /** The faults of a design at their cells of the input workbook. */
    static InputRefused at(String file, List<DesignFault> faults) {
        return new InputRefused(faults.stream().map(fault -> at(file, fault)).toList());
    }

    private static Fault at(String file, DesignFault fault) {
        String cell = fault.origin().cell();
        return new Fault(file, fault.origin().sheet(), cell.isEmpty() ? null : cell, fault.message(), fault.code());
    }

    private static String inWords(java.io.IOException failure) {
        String message = String.valueOf(failure.getMessage());
        if (failure instanceof NotWritten) {
            return message;
        }
        if (failure instanceof java.nio.file.FileAlreadyExistsException) {
            return message + " is there already; it is not written over. Name another file.";
        }
        if (failure instanceof java.nio.file.AccessDeniedException) {
            return "no right to use " + message + ", or it is open in another program";
        }
        return message;
    }

    /** A fault of the program itself, or of the machine it runs on; the details go into a file. */
    static int internal(PrintWriter err, Throwable failure) {
        StringWriter trace = new StringWriter();
        failure.printStackTrace(new PrintWriter(trace));
        try {
            Path report = Files.createTempFile("nappe-fault-", ".txt");
            Files.writeString(report, trace.toString());
            err.println("nappe: a fault of the program itself: " + failure + "; details in " + report
                    + " (fault: internal)");
        } catch (java.io.IOException e) {
            err.println("nappe: a fault of the program itself: " + failure + " (fault: internal)");
        }
        return ExitStatus.INTERNAL_FAULT;
    }
}

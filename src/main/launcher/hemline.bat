@echo off
rem Starts Hemline. Needs a Java 17 or newer runtime: JAVA_HOME if set, else java on the path.
setlocal
set "HOME_DIR=%~dp0.."
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
if /i "%~1"=="view" (
  "%JAVA%" %HEMLINE_JAVA_OPTS% --module-path "%HOME_DIR%\javafx" --add-modules javafx.controls,javafx.swing -cp "%HOME_DIR%\lib\*" hemline.cli.Main %*
) else (
  "%JAVA%" %HEMLINE_JAVA_OPTS% -Djava.awt.headless=true -cp "%HOME_DIR%\lib\*;%HOME_DIR%\javafx\*" hemline.cli.Main %*
)
exit /b %ERRORLEVEL%

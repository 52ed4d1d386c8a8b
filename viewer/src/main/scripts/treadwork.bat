@echo off
rem Starts Treadwork. Java 17 or newer is taken from JAVA_HOME, else from the path; TREADWORK_JAVA_OPTIONS adds options.
setlocal
set "home=%~dp0.."
set "java=java"
if defined JAVA_HOME if exist "%JAVA_HOME%\bin\java.exe" set "java=%JAVA_HOME%\bin\java.exe"
where "%java%" >nul 2>nul || if not exist "%java%" (
  echo treadwork: no Java found: install Java 17 or newer, or set JAVA_HOME 1>&2
  exit /b 2
)
rem Studies and the window run long enough for the optimising compiler to pay; what ends in a second or two does not.
set "tuning=-XX:+UseSerialGC -XX:TieredStopAtLevel=1"
for %%c in (compute compare report view) do if "%~1"=="%%c" set "tuning=-XX:+UseParallelGC"
if "%~1"=="" set "tuning=-XX:+UseParallelGC"
"%java%" %tuning% -Xshare:auto %TREADWORK_JAVA_OPTIONS% -cp "%home%\lib\*" treadwork.solver.cli.Treadwork %*
